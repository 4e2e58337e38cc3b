import type { Verdict } from '@ferrite-row/levels';
import { token, type TokenName } from '../../../shared-ui/tokens';
import type { ProductMark } from './marks';

const COLOURS: Record<Verdict, TokenName> = {
  pass: 'ink',
  'too close to call': 'brass',
  'not yet': 'oxide',
};

/** Round the wanted product; a tick inside it would only blur it. */
const RING = 7;
const TICK = 5;
const THIN_TICK = 4.5;
const DOTS = '1.6 2.6';

/** The end of a stem: shape first, colour second. */
function EndMark({ mark: { row, x, yEnd, isOff } }: { mark: ProductMark }) {
  const { verdict, isWanted } = row.product;
  if (isWanted) {
    return (
      <g stroke={token('green')}>
        <circle cx={x} cy={yEnd} r="5.4" strokeWidth="2" fill={token('paper')} />
        <circle cx={x} cy={yEnd} r="2.2" fill={token('green')} stroke="none" />
      </g>
    );
  }
  if (isOff) return <path d={offMark(x, yEnd, 3.6)} fill={token(COLOURS[verdict])} />;
  if (verdict === 'pass') return <circle cx={x} cy={yEnd} r="3.6" fill={token('ink')} />;
  if (verdict === 'not yet') {
    return (
      <rect
        x={x - 4.5}
        y={yEnd - 4.5}
        width="9"
        height="9"
        rx="1"
        fill={token('paper')}
        stroke={token('oxide')}
        strokeWidth="2"
      />
    );
  }
  return (
    <path
      d={`M${x} ${yEnd - 6}l6 6-6 6-6-6z`}
      fill={token('paper')}
      stroke={token('brass')}
      strokeWidth="2"
    />
  );
}

/** A triangle that stands on the axis and points under it. */
const offMark = (x: number, y: number, half: number): string =>
  `M${x - half} ${y - 1.6 * half}h${2 * half}l${-half} ${1.6 * half}z`;

/** A product of the table: tick, dotted stem, end mark. */
export function NamedMark({ mark }: { mark: ProductMark }) {
  const { row, x, yTick, yEnd } = mark;
  const { isWanted, verdict } = row.product;
  const isTickSeen = !isWanted || Math.abs(yEnd - yTick) > RING;
  return (
    <g>
      <path
        d={`M${x} ${yTick}V${yEnd}`}
        stroke={token(isWanted ? 'green' : COLOURS[verdict])}
        strokeWidth="1.6"
        strokeDasharray={DOTS}
      />
      {isTickSeen && <path d={`M${x - TICK} ${yTick}h${2 * TICK}`} stroke={token('ink')} strokeWidth="2" />}
      <EndMark mark={mark} />
    </g>
  );
}

const DOT = 1.8;
const dot = (x: number, y: number): string =>
  `M${x - DOT} ${y}a${DOT} ${DOT} 0 1 0 ${2 * DOT} 0a${DOT} ${DOT} 0 1 0 ${-2 * DOT} 0z`;

/** All products that are not in the table, in three paths however many they are. */
export function ThinMarks({ marks }: { marks: readonly ProductMark[] }) {
  const join = (of: (mark: ProductMark) => string) => marks.map(of).join('');
  return (
    <g stroke={token('ink3')} fill="none">
      <path d={join(({ x, yTick, yEnd }) => `M${x} ${yTick}V${yEnd}`)} strokeDasharray={DOTS} />
      <path d={join(({ x, yTick }) => `M${x - THIN_TICK} ${yTick}h${2 * THIN_TICK}`)} />
      <path
        d={join(({ x, yEnd, isOff }) => (isOff ? offMark(x, yEnd, 2.6) : dot(x, yEnd)))}
        fill={token('ink3')}
        stroke="none"
      />
    </g>
  );
}
