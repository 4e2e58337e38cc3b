import { fieldError } from '../common/common.errors';

export const MOST_NIGHTS = 60;
const MOST_WEEKS = 12;
const DAYS = ['MO', 'TU', 'WE', 'TH', 'FR', 'SA', 'SU'] as const;
type Day = (typeof DAYS)[number];

/** What of RFC 5545 a club's series may say: every so many weeks, on these days, so often or until then. */
export interface WeeklyRule {
  interval: number;
  /** Empty: on the day of the first night. */
  days: Day[];
}

const FIELD = 'repeat.rule';
const refuse = (detail: string): never => {
  throw fieldError(FIELD, detail);
};

/** How each part of a rule is read; a part that is not here is refused by name. */
const PARTS: Record<string, (value: string) => void> = {
  FREQ: (value) => {
    if (value !== 'WEEKLY') refuse(`A series repeats by weeks: FREQ=WEEKLY, not FREQ=${value}.`);
  },
  INTERVAL: (value) => void whole('INTERVAL', value, MOST_WEEKS, 'weeks apart'),
  COUNT: (value) => void whole('COUNT', value, MOST_NIGHTS, 'nights'),
  BYDAY: (value) => void readDays(value),
  UNTIL: (value) => void readUntil(value),
};

/**
 * Reads the rule of a series, such as `FREQ=WEEKLY;BYDAY=TU;COUNT=6`.
 *
 * @throws DomainError `invalid-input` on `repeat.rule`, in words, for everything else.
 * @see RFC 5545, 3.3.10, "Recurrence Rule"
 */
export function readRule(text: string): WeeklyRule {
  const parts = new Map(text.split(';').map(readPart));
  if (parts.size < text.split(';').length) refuse('A part stands in the rule twice.');
  for (const [name, value] of parts) PARTS[name]?.(value);
  if (!parts.has('FREQ')) refuse('The rule does not say FREQ=WEEKLY.');
  if (parts.has('COUNT') === parts.has('UNTIL')) {
    refuse('The rule says either how many nights, COUNT, or until when, UNTIL.');
  }
  const days = parts.get('BYDAY');
  return { interval: Number(parts.get('INTERVAL') ?? 1), days: days === undefined ? [] : readDays(days) };
}

function readPart(part: string): [name: string, value: string] {
  const [name, value, ...more] = part.split('=');
  if (!name || !value || more.length > 0) return refuse(`“${part.slice(0, 40)}” is not a part of a rule.`);
  if (!Object.hasOwn(PARTS, name)) {
    return refuse(
      `A series knows FREQ, INTERVAL, BYDAY, COUNT and UNTIL; it does not know ${name.slice(0, 20)}.`,
    );
  }
  return [name, value];
}

function whole(name: string, value: string, most: number, unit: string): number {
  const isWhole = /^\d{1,4}$/.test(value) && Number(value) >= 1 && Number(value) <= most;
  return isWhole ? Number(value) : refuse(`${name} is a whole number of ${unit}, 1 to ${most}.`);
}

function readDays(value: string): Day[] {
  const days = value.split(',');
  const known = DAYS.filter((day) => days.includes(day));
  if (known.length < days.length) refuse('BYDAY names each day once, such as TU or TU,TH.');
  return known;
}

function readUntil(value: string): void {
  const isInstant = /^\d{8}T\d{6}Z$/.test(value) && !Number.isNaN(Date.parse(isoOf(value)));
  if (!isInstant) refuse('UNTIL is an instant in UTC, such as 20270331T235959Z.');
}

const isoOf = (compact: string): string =>
  compact.replace(/^(\d{4})(\d{2})(\d{2})T(\d{2})(\d{2})(\d{2})Z$/, '$1-$2-$3T$4:$5:$6Z');

/** Whether the first night lies on a day of the rule; RFC 5545 leaves undefined what happens if not. */
export function fallsOn(rule: WeeklyRule, dayOfWeek: number): boolean {
  const day = DAYS[dayOfWeek - 1];
  return rule.days.length === 0 || (day !== undefined && rule.days.includes(day));
}
