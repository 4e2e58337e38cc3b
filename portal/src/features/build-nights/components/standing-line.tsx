import { StateLine } from '../../../shared-ui/states/state-line';
import type { BuildNight } from '../api/nights';

const LOOKS = {
  coming: { shape: 'tick', colour: 'green', words: 'Coming' },
  waiting: { shape: 'half', colour: 'trace', words: 'Waiting' },
  'on duty': { shape: 'flag', colour: 'ink', words: 'On duty' },
} as const;

/** How the person stands to a night, in shape and word; nothing when they have not said anything. */
export function StandingLine({ night }: { night: Pick<BuildNight, 'mine' | 'cancelledAt'> }) {
  if (night.cancelledAt) {
    return (
      <StateLine shape="octagon" colour="oxide">
        Cancelled
      </StateLine>
    );
  }
  if (!night.mine) return null;
  const { shape, colour, words } = LOOKS[night.mine.state];
  return <StateLine {...{ shape, colour }}>{words}</StateLine>;
}
