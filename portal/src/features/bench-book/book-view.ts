import { useSearchParams } from 'react-router-dom';
import { addDays, clubDay, weekStart } from '../../lib/club-time';

type BookViewKind = 'lanes' | 'list';

/** What the address says: which week and day, which benches and instruments, lanes or list, and what a check needs. */
export interface BookView {
  week: string;
  /** The one day a phone shows. */
  day: string;
  kind: BookViewKind;
  /** Tags of the lanes, in order; empty when none was chosen. */
  tags: readonly string[];
  /** From a check that needs an instrument: its id and the kind's name. */
  check: string;
  need: string;
  showDay: (day: string) => void;
  showKind: (kind: BookViewKind) => void;
  showTags: (tags: readonly string[]) => void;
  /** Forgets the check once it has filled the form. */
  dropNeed: () => void;
}

const DAY = /^\d{4}-\d{2}-\d{2}$/;

const isDay = (text: string | null): text is string =>
  text !== null && DAY.test(text) && !Number.isNaN(Date.parse(text));

export function useBookView(): BookView {
  const [params, setParams] = useSearchParams();
  const asked = params.get('day');
  const day = isDay(asked) ? asked : clubDay();
  const change = (changes: Record<string, string | undefined>) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        for (const [name, value] of Object.entries(changes)) {
          if (value) after.set(name, value);
          else after.delete(name);
        }
        return after;
      },
      { replace: true, preventScrollReset: true },
    );
  return {
    week: weekStart(day),
    day,
    kind: params.get('view') === 'list' ? 'list' : 'lanes',
    tags: (params.get('show') ?? '').split(',').filter((tag) => tag !== ''),
    check: params.get('check') ?? '',
    need: params.get('need') ?? '',
    showDay: (next) => change({ day: next === clubDay() ? undefined : next }),
    showKind: (kind) => change({ view: kind === 'list' ? 'list' : undefined }),
    showTags: (tags) => change({ show: tags.join(',') }),
    dropNeed: () => change({ check: undefined, need: undefined }),
  };
}

/** The day of the week before or after that has the same name; today in today's own week. */
export const sameDayIn = (day: string, weeks: number): string => addDays(day, 7 * weeks);
