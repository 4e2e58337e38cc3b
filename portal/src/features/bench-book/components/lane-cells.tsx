import { clockText, dayText } from '../../../lib/club-time-text';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { Block } from '../lanes/blocks';
import { blockAt } from '../lanes/blocks';
import { SLOT_MINUTES, slotsOf } from '../lanes/cursor';
import type { Extent } from '../lanes/extent';
import { isClosedIn, type OpenDay } from '../../../lib/opening-hours';
import { hatchOf } from '../lanes/hatches';
import type { Lane } from '../lanes/lane';

interface LaneCellsProps {
  idPrefix: string;
  dates: readonly string[];
  lanes: readonly Lane[];
  blocks: readonly Block[];
  today: string;
  hours: readonly OpenDay[];
  extent: Extent;
  /** The half hour the keyboard is at. */
  slot: number;
  /** Rows of heads over the first half hour. */
  headRows: number;
}

export const cellId = (prefix: string, column: number, slot: number): string => `${prefix}-${column}-${slot}`;

/** Who a booking is said to be: "You", a name, or a night's title. */
export const whoHas = ({ booking }: Pick<Block, 'booking'>): string =>
  booking.kind === 'build night' ? booking.title : booking.mine ? 'You' : booking.personName;

/**
 * What a screen reader says of the half hours: who has it until when, why it cannot be had, or that it is free. Only
 * the rows around the keyboard exist, with their numbers; a thousand cells in three lanes would slow everybody down.
 */
export function LaneCells(props: LaneCellsProps) {
  const { idPrefix, dates, lanes, blocks, today, hours, extent, slot, headRows } = props;
  const { first, end } = slotsOf(extent);
  const words = (date: string, lane: number, minute: number): string => {
    const block = blockAt(blocks, { date, lane, minute });
    const hatch = hatchOf(lanes[lane]?.instrument, date, today);
    const isClosed = isClosedIn(hours, date, { from: minute, to: minute + SLOT_MINUTES });
    const state = block
      ? `${whoHas(block)} until ${clockText(block.bottom)}`
      : (hatch ?? (isClosed ? 'free, the workshop is closed' : 'free'));
    return `${dayText(date)} ${clockText(minute)}, ${lanes[lane]?.tag ?? ''}, ${state}`;
  };
  const near = [slot - 1, slot, slot + 1].filter((row) => row >= first && row < end);
  return near.map((row) => (
    <VisuallyHidden key={row}>
      <div role="row" aria-rowindex={row - first + headRows + 1}>
        <span role="rowheader">{clockText(row * SLOT_MINUTES)}</span>
        {dates.flatMap((date, day) =>
          lanes.map((_lane, index) => {
            const column = day * lanes.length + index;
            return (
              <span
                key={column}
                role="gridcell"
                id={cellId(idPrefix, column, row)}
                aria-colindex={column + 2}
                aria-label={words(date, index, row * SLOT_MINUTES)}
              />
            );
          }),
        )}
      </div>
    </VisuallyHidden>
  ));
}
