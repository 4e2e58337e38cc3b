import { fixed, signed } from '../lib/text';
import { token, type TokenName } from './tokens';
import { useWidth } from './level-diagram/use-width';

export interface WindowBarProps {
  /** Ends of the window; one may be missing. */
  low?: number;
  high?: number;
  target?: number;
  reading?: { value: number; expandedUncertainty: number };
  /** Scale shown; a reading outside of it stands at the edge. Left out: the window and its reading with room around. */
  from?: number;
  to?: number;
  /** Ring and whisker: copper while being entered or too close, green when it passes, ink when kept, ink3 when stale. */
  tone?: Extract<TokenName, 'copper' | 'green' | 'ink' | 'ink3' | 'oxide'>;
  /** Without figures, for a row of a list. */
  compact?: boolean;
  unit?: string;
}

const EDGE = 10;

function scaleOf({ low, high, target, reading, from, to }: WindowBarProps): [number, number] {
  const marks = [low, high, target, reading?.value].filter((mark) => mark !== undefined);
  const [least, most] = [Math.min(...marks), Math.max(...marks)];
  const room = Math.max((most - least) / 3, 0.5);
  return [from ?? Math.floor(least - room), to ?? Math.ceil(most + room)];
}

function ticksOf(from: number, to: number): number[] {
  const rough = (to - from) / 5;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].map((factor) => factor * power).find((size) => size >= rough * 0.99) ?? rough;
  const first = Math.ceil(from / step - 1e-9);
  return Array.from(
    { length: Math.floor(to / step + 1e-9) - first + 1 },
    (_, index) => (first + index) * step,
  );
}

const spoken = ({ low, high, reading, unit = '' }: WindowBarProps): string => {
  const window =
    low !== undefined && high !== undefined
      ? `Window ${signed(low)} to ${signed(high)} ${unit}`
      : `Window ${low === undefined ? `at most ${fixed(high ?? 0)}` : `${fixed(low)} or more`} ${unit}`;
  return reading
    ? `${window}. Reading ${signed(reading.value, 2)}, plus or minus ${fixed(reading.expandedUncertainty, 2)}.`
    : `${window}.`;
};

/** A window on one line: green box with end posts, target as a dotted tick, the reading as a ring with its whisker. */
export function WindowBar(props: WindowBarProps) {
  const { low, high, target, reading, tone = 'copper', compact = false } = props;
  const [frame, width] = useWidth<HTMLDivElement>(compact ? 100 : 250);
  const [from, to] = scaleOf(props);
  const edge = compact ? 0 : EDGE;
  const x = (value: number) =>
    edge + ((Math.max(from, Math.min(to, value)) - from) / (to - from)) * (width - 2 * edge);
  const middle = compact ? 13 : 14;
  const post = compact ? 10 : 12;
  return (
    <div ref={frame} style={{ minWidth: 0 }}>
      <svg
        width={width}
        height={compact ? 26 : 42}
        role="img"
        aria-label={spoken(props)}
        fill="none"
        fontSize="11"
        style={{ display: 'block' }}
      >
        <rect
          x={x(low ?? from)}
          y={middle - (compact ? 8 : 9)}
          width={x(high ?? to) - x(low ?? from)}
          height={compact ? 15 : 18}
          fill={token('greenTint')}
        />
        <path d={`M${x(from)} ${middle}H${x(to)}`} stroke={token(compact ? 'rule' : 'edge')} />
        {!compact && <Ticks ticks={ticksOf(from, to)} x={x} y={middle} />}
        {[low, high].map(
          (end) =>
            end !== undefined && (
              <path
                key={end}
                d={`M${x(end)} ${middle - post}V${middle + post}`}
                stroke={token('green')}
                strokeWidth="2"
              />
            ),
        )}
        {target !== undefined && (
          <path
            d={`M${x(target)} ${middle - 6}V${middle + 6}`}
            stroke={token('green')}
            strokeWidth="2"
            strokeDasharray="2 2"
          />
        )}
        {reading && <Reading x={x} y={middle} {...reading} tone={tone} />}
      </svg>
    </div>
  );
}

function Ticks({ ticks, x, y }: { ticks: number[]; x: (value: number) => number; y: number }) {
  const decimals = ticks.every(Number.isInteger) ? 0 : 1;
  return ticks.map((tick) => (
    <g key={tick}>
      <path d={`M${x(tick)} ${y}v5`} stroke={token('edge')} />
      <text x={x(tick)} y={y + 25} textAnchor="middle" fontWeight="600" fill={token('ink2')}>
        {signed(tick, decimals)}
      </text>
    </g>
  ));
}

interface ReadingProps {
  x: (value: number) => number;
  y: number;
  value: number;
  expandedUncertainty: number;
  tone: TokenName;
}

function Reading({ x, y, value, expandedUncertainty, tone }: ReadingProps) {
  const [left, right] = [x(value - expandedUncertainty), x(value + expandedUncertainty)];
  const isKept = tone === 'ink';
  return (
    <g stroke={token(tone)} strokeWidth="2">
      <path d={`M${left} ${y}H${right}M${left} ${y - 6}v12M${right} ${y - 6}v12`} />
      <circle cx={x(value)} cy={y} r={isKept ? 4 : 5} fill={token(isKept ? 'ink' : 'sheet')} />
    </g>
  );
}
