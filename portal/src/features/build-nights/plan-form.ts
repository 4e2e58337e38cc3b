import { addDays, clubDay, instantOf, readClock } from '../../lib/club-time';
import type { NightPlan, NightRemedy, NightTimes } from './api/nights';
import { ruleOf, type Repeats } from './night-words';

/** The form as it is typed; everything text, so that nothing half typed is lost. */
export interface PlanForm {
  title: string;
  repeats: Repeats;
  /** '2026-10-20' */
  first: string;
  nights: string;
  from: string;
  to: string;
  places: string;
  benchIds: string[];
  mentorIds: string[];
  stageIds: string[];
  note: string;
  tellByMail: boolean;
  /** Days left out. */
  skip: string[];
  /** What a remedy put in place of the benches or mentors of one day. */
  instead: (NightRemedy & { date: string })[];
}

export const emptyPlan = (repeats: Repeats, mentorId: string): PlanForm => ({
  title: '',
  repeats,
  first: addDays(clubDay(), 7),
  nights: '6',
  from: '19:30',
  to: '21:30',
  places: '8',
  benchIds: [],
  mentorIds: [mentorId],
  stageIds: [],
  note: '',
  tellByMail: true,
  skip: [],
  instead: [],
});

const MOST_NIGHTS = 60;
const MOST_PLACES = 100;
const DAY_MINUTES = 24 * 60;
const LONGEST_MINUTES = 12 * 60;

/** A whole number typed, within its bounds. */
function readWhole(text: string, most: number): number | undefined {
  const isWhole = /^\d{1,4}$/.test(text.trim());
  const value = Number(text);
  return isWhole && value >= 1 && value <= most ? value : undefined;
}

/** An end that is earlier on the clock is the next day's, which is right for a late night and wrong for a slip. */
function isTooLong({ from, to }: PlanForm): boolean {
  const [start, end] = [readClock(from), readClock(to)];
  if (start === undefined || end === undefined) return false;
  return (end > start ? end - start : end + DAY_MINUTES - start) > LONGEST_MINUTES;
}

/** Words for a field that cannot be read, by its name; empty when every one can. */
export function formErrors(form: PlanForm): Partial<Record<keyof PlanForm, string>> {
  const errors: Partial<Record<keyof PlanForm, string>> = {};
  if (form.title.trim() === '') errors.title = 'Give it a name.';
  if (!/^\d{4}-\d{2}-\d{2}$/.test(form.first)) errors.first = 'Choose a day.';
  if (readClock(form.from) === undefined) errors.from = 'A time such as 19:30.';
  if (readClock(form.to) === undefined) errors.to = 'A time such as 21:30.';
  if (isTooLong(form)) errors.to = 'It ends before it begins, or lasts longer than 12 hours.';
  if (readWhole(form.places, MOST_PLACES) === undefined) errors.places = `1 to ${MOST_PLACES}.`;
  if (form.repeats !== 'once' && readWhole(form.nights, MOST_NIGHTS) === undefined) {
    errors.nights = `1 to ${MOST_NIGHTS}.`;
  }
  return errors;
}

/** What the dates are looked up with; undefined while day, times or number cannot be read. */
export function timesOf(form: PlanForm): NightTimes | undefined {
  const [from, to] = [readClock(form.from), readClock(form.to)];
  const nights = form.repeats === 'once' ? 1 : readWhole(form.nights, MOST_NIGHTS);
  const isReadable = /^\d{4}-\d{2}-\d{2}$/.test(form.first) && nights !== undefined;
  if (from === undefined || to === undefined || !isReadable) return undefined;
  const rule = ruleOf(form.repeats, nights);
  return {
    startsAt: instantOf(form.first, from),
    // An end that is earlier on the clock is the next day's.
    endsAt: instantOf(form.first, to > from ? to : to + DAY_MINUTES),
    ...(rule ? { repeat: { rule }, skip: form.skip } : {}),
    instead: form.instead,
    benchIds: form.benchIds,
    mentorIds: form.mentorIds,
    stageIds: form.stageIds,
  };
}

/** The plan to send, when every field can be read. */
export function planOf(form: PlanForm): NightPlan | undefined {
  const times = timesOf(form);
  const places = readWhole(form.places, MOST_PLACES);
  if (!times || places === undefined || Object.keys(formErrors(form)).length > 0) return undefined;
  const tellByMail = form.tellByMail && form.stageIds.length > 0;
  return { ...times, title: form.title.trim(), places, note: form.note.trim(), tellByMail };
}

/** Which field a refusal of the API speaks of, in the form's own names. */
export const FIELD_OF: Record<string, keyof PlanForm> = {
  '#/title': 'title',
  '#/startsAt': 'first',
  '#/endsAt': 'to',
  '#/repeat/rule': 'nights',
  '#/places': 'places',
  '#/benchIds': 'benchIds',
  '#/mentorIds': 'mentorIds',
  '#/stageIds': 'stageIds',
  '#/note': 'note',
};
