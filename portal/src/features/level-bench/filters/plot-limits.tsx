import { fixed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import type { Judged, JudgedLimit } from './judged';
import { HALO, type LayerProps } from './plot-layers';
import { GAIN, gainToY, RETURN, returnToY } from './plot-scale';

const HALF = 12;
/** Room for "22.0 needed" at the right of its bar. */
const WORDS = 78;

const OCTAGON = 'M3.5 .5h4l3 3v4l-3 3h-4l-3-3v-4zM5.5 3v3M5.5 8v.1';

function Octagon({ x, y }: { x: number; y: number }) {
  return (
    <path
      transform={`translate(${x} ${y})`}
      d={OCTAGON}
      fill={token('paper')}
      stroke={token('oxide')}
      strokeWidth="1.3"
    />
  );
}

interface LimitProps {
  limit: JudgedLimit;
  x: number;
  right: number;
  hatchId: string;
  /** Gain at the carrier: rejection counts from there. */
  carrierDb: number;
}

/** A bar at what is needed, brass from it to the worst build: that is in hand. Short of it there is none, but an octagon. */
function LimitBar({ limit, x, right, hatchId, carrierDb }: LimitProps) {
  const bar = Math.min(gainToY(carrierDb - limit.neededDb), GAIN.bottom);
  const worst = limit.worstDb === undefined ? bar : Math.min(gainToY(carrierDb - limit.worstDb), GAIN.bottom);
  const isShort = limit.verdict !== 'pass';
  const isLeft = x + HALF + WORDS > right;
  const words = isLeft ? x - HALF - 6 : x + HALF + 6;
  return (
    <g>
      {worst > bar && (
        <rect x={x - HALF} y={bar} width={2 * HALF} height={worst - bar} fill={`url(#${hatchId})`} />
      )}
      <path d={`M${x - HALF} ${bar}h${2 * HALF}`} stroke={token('oxide')} strokeWidth="2.4" />
      {isShort && <Octagon x={isLeft ? words - WORDS - 8 : words} y={bar - 6} />}
      <text
        {...HALO}
        x={words + (isShort && !isLeft ? 15 : 0)}
        y={bar + 4}
        textAnchor={isLeft ? 'end' : 'start'}
        fontSize="11"
        fontWeight="700"
        fill={token('oxide')}
      >
        {`${fixed(limit.neededDb)} needed`}
      </text>
    </g>
  );
}

/** What is taken as fitted; a triangle on the axis when that lies below the scale. */
function Taken({ limit, x, carrierDb }: Pick<LimitProps, 'limit' | 'x' | 'carrierDb'>) {
  const y = gainToY(carrierDb - limit.takenDb);
  const isOff = y > GAIN.bottom;
  return (
    <g>
      {isOff ? (
        <path d={`M${x - 4} ${GAIN.bottom - 7}h8l-4 7z`} fill={token('ink')} />
      ) : (
        <circle cx={x} cy={y} r="3.4" fill={token('ink')} />
      )}
      <text
        {...HALO}
        x={x - 8}
        y={isOff ? GAIN.bottom - 3 : y + 13}
        textAnchor="end"
        fontSize="11"
        fontWeight="700"
        fill={token('ink')}
      >
        {fixed(limit.takenDb)}
      </text>
    </g>
  );
}

interface LimitNameProps {
  name: string;
  x: number;
  right: number;
  isNarrow: boolean;
}

/** Names of the limits above the plot; the last ends where the plot does. */
function LimitName({ name, x, right, isNarrow }: LimitNameProps) {
  const words = isNarrow ? name.replace(' harmonic', '') : name;
  const isAtEnd = x + 48 > right;
  return (
    <g>
      <path d={`M${x} ${GAIN.top - 6}v6`} stroke={token('ink3')} />
      <text
        x={isAtEnd ? right + 2 : x}
        y={GAIN.top - 11}
        textAnchor={isAtEnd ? 'end' : 'middle'}
        fontSize="11"
        fontWeight="600"
        fill={token('ink2')}
      >
        {words}
      </text>
    </g>
  );
}

interface LimitsProps extends LayerProps {
  judged: Judged;
  hatchId: string;
}

export function Limits({ figures, judged: { limits }, x, right, hatchId }: LimitsProps) {
  const { axis, carrier, response } = figures;
  const carrierDb = response.gainDb[response.hertz.indexOf(carrier.lowHertz)];
  const seen = limits.filter(({ hertz }) => hertz <= axis.endHertz);
  return (
    <g>
      {seen.map((limit) => (
        <LimitBar key={limit.hertz} {...{ limit, right, hatchId, carrierDb }} x={x(limit.hertz)} />
      ))}
      {seen.map((limit) => (
        <g key={limit.hertz}>
          <Taken {...{ limit, carrierDb }} x={x(limit.hertz)} />
          <LimitName name={limit.name} x={x(limit.hertz)} right={right} isNarrow={right < 420} />
        </g>
      ))}
    </g>
  );
}

/** What is wanted of the match, a little wider than the band so that it can be seen. */
export function ReturnLossLimit({
  figures,
  judged: { returnLoss },
  x,
}: Omit<LimitsProps, 'hatchId' | 'right'>) {
  const { carrier } = figures;
  const y = Math.min(returnToY(returnLoss.wantedDb), RETURN.bottom);
  const [low, high] = [x(carrier.lowHertz) - 20, x(carrier.highHertz) + 20];
  const isShort = returnLoss.verdict !== 'pass';
  return (
    <g>
      <path d={`M${low} ${y}H${high}`} stroke={token('oxide')} strokeWidth="2.4" />
      {isShort && <Octagon x={high + 4} y={y - 6} />}
      <text
        {...HALO}
        x={high + (isShort ? 19 : 4)}
        y={y + 4}
        fontSize="11"
        fontWeight="700"
        fill={token('oxide')}
      >
        {`${Number(returnLoss.wantedDb.toPrecision(3))} or more wanted`}
      </text>
    </g>
  );
}
