import { useSearchParams } from 'react-router-dom';
import { clubDay, monthStart } from '../../lib/club-time';
import type { BuildNight } from './api/nights';

export type NightsViewName = 'month' | 'list';
export type PlanningKind = 'series' | 'night';

/** What the address says: month, view, the night that is open, and the form beside it. */
export interface NightsPlace {
  /** '2026-10-01' */
  month: string;
  view: NightsViewName;
  nightId?: string;
  planning?: PlanningKind;
  plannedDay?: string;
  changingId?: string;
  goTo: (month: string) => void;
  show: (view: NightsViewName) => void;
  open: (nightId: string, month?: string) => void;
  plan: (kind: PlanningKind) => void;
  change: (nightId: string) => void;
  /** A day was pressed: it opens its night, or becomes the day of what is being planned. */
  pickDay: (day: string, nights: readonly BuildNight[]) => void;
  closeDrawer: () => void;
}

type Params = Record<'month' | 'view' | 'night' | 'plan' | 'day' | 'change', string | undefined>;

const isMonth = (text: string | null): text is string => /^\d{4}-(0[1-9]|1[0-2])$/.test(text ?? '');

/** The page's state lives in its address, so that a link leads to the same place. */
export function useNightsPlace(isPhone: boolean): NightsPlace {
  const [params, setParams] = useSearchParams();
  const read = (name: keyof Params): string | undefined => params.get(name) ?? undefined;
  const write = (change: Partial<Params>) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        for (const [name, value] of Object.entries(change)) {
          if (value === undefined) after.delete(name);
          else after.set(name, value);
        }
        return after;
      },
      { replace: true, preventScrollReset: true },
    );
  const asked = params.get('month');
  const month = isMonth(asked) ? `${asked}-01` : monthStart(clubDay());
  const view = read('view') ?? (isPhone ? 'list' : 'month');
  const planning = read('plan');
  return {
    month,
    view: view === 'list' ? 'list' : 'month',
    nightId: read('night'),
    planning: planning === 'series' || planning === 'night' ? planning : undefined,
    plannedDay: read('day'),
    changingId: read('change'),
    goTo: (next) => write({ month: next.slice(0, 7), night: undefined }),
    show: (next) => write({ view: next }),
    open: (night, inMonth) =>
      write({ night, ...(inMonth && { month: inMonth.slice(0, 7), plan: undefined, day: undefined }) }),
    plan: (kind) => write({ plan: kind, change: undefined, day: undefined }),
    change: (night) => write({ change: night, plan: undefined }),
    pickDay: (day, nights) => {
      const night = nights.find(({ startsAt }) => clubDay(startsAt) === day);
      if (planning) write({ day });
      else if (night) write({ night: night.id });
    },
    closeDrawer: () => write({ plan: undefined, change: undefined, day: undefined }),
  };
}
