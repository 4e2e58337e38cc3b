import { clubDay } from '../../../lib/club-time';
import type { BuildNight } from '../api/nights';
import { entryOf, openFirst, type Entry } from '../night-view';
import { Legend } from './legend';
import { MonthGrid } from './month-grid';
import { NightPanel } from './night-panel';

interface MonthViewProps {
  month: string;
  nights: readonly BuildNight[];
  planned: readonly Entry[];
  isPlanning: boolean;
  openId?: string;
  onOpen: (nightId: string) => void;
  onChange: (nightId: string) => void;
  onDay: (day: string) => void;
  onMore: () => void;
}

/** The month, what its boxes mean, and below it the night that is open. */
export function MonthView({ month, nights, planned, isPlanning, openId, onChange, ...grid }: MonthViewProps) {
  const shown = nights.find(({ id }) => id === openId) ?? openFirst(nights, new Date());
  return (
    <>
      <MonthGrid
        {...grid}
        month={month}
        nights={nights}
        entries={[...nights.map(entryOf), ...planned]}
        pickedDay={shown && clubDay(shown.startsAt)}
      />
      <Legend nights={nights} isPlanning={isPlanning} />
      {shown && <NightPanel nightId={shown.id} onChange={onChange} />}
    </>
  );
}
