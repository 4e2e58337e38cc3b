import Button from '@mui/material/Button';
import { useState } from 'react';
import { counted } from '../../../lib/text';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { Booking, Instrument } from '../api/bench-book';
import type { TypedTimes } from '../form/booking-values';
import { holderOf, instrumentWords } from '../form/instrument-words';
import { InstrumentRow } from './instrument-row';

interface InstrumentRowsProps {
  instruments: readonly Instrument[];
  /** Those shown in the lanes come first. */
  laneIds: readonly string[];
  chosen: readonly string[];
  times: TypedTimes | undefined;
  /** Of the day that is typed. */
  bookings: readonly Booking[];
  errors: Readonly<Record<string, string>>;
  hasHeading: boolean;
  onChange: (chosen: string[]) => void;
}

const SHOWN = 5;

/** The instruments to choose from: in the lanes or chosen first, then those that may be had, then the others. */
export function InstrumentRows(props: InstrumentRowsProps) {
  const { instruments, laneIds, chosen, times, bookings, errors, hasHeading, onChange } = props;
  const [showsAll, setShowsAll] = useState(false);
  // Ticking a row must not make it jump, so the order is by what was chosen when the list was opened.
  const [first] = useState(() => [...laneIds, ...chosen]);
  const rank = ({ id, mayBook }: Instrument): number => (first.includes(id) ? 0 : mayBook ? 1 : 2);
  const sorted = [...instruments].sort((a, b) => rank(a) - rank(b) || a.position - b.position);
  const shown = showsAll ? sorted : sorted.filter(({ id }, index) => index < SHOWN || chosen.includes(id));
  const more = sorted.length - shown.length;
  const toggle = (id: string, isChosen: boolean) =>
    onChange(isChosen ? [...chosen, id] : chosen.filter((other) => other !== id));
  return (
    <section aria-label="Instruments">
      {hasHeading && <SectionHeading>Instruments</SectionHeading>}
      {shown.map((instrument) => (
        <InstrumentRow
          key={instrument.id}
          instrument={instrument}
          words={instrumentWords(instrument, holderOf(instrument.id, times, bookings))}
          error={errors[instrument.id]}
          checked={chosen.includes(instrument.id)}
          onChange={(isChosen) => toggle(instrument.id, isChosen)}
        />
      ))}
      {more > 0 && (
        <Button variant="text" onClick={() => setShowsAll(true)} sx={{ px: 0, fontSize: '0.8125rem' }}>
          Show {counted(more, 'more instrument')}
        </Button>
      )}
    </section>
  );
}
