import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { fixed } from '../../../lib/text';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token } from '../../../shared-ui/tokens';
import { axisFigures, histogramOf } from './histogram';
import type { JudgedLimit } from './judged';
import { megahertz, spreadWords } from './words';

const TOP = 18;
const FOOT = 62;
const HEIGHT = 80;

/** Room for "needed 22.0" and for "26.1". */
const WORDS = { needed: 76, taken: 30 } as const;

/** Beside its line, on the side away from the other one unless the frame ends there. */
function beside(x: number, other: number, width: number, room: number) {
  const isLeft = x <= other ? x > room : x + room > width;
  return isLeft ? ({ x: x - 5, textAnchor: 'end' } as const) : ({ x: x + 5, textAnchor: 'start' } as const);
}

function Bars({ limit, builds, width }: { limit: JudgedLimit; builds: Float64Array; width: number }) {
  const { from, step, counts } = histogramOf(builds);
  const [low, high] = [
    Math.min(from, limit.neededDb) - step,
    Math.max(from + step * counts.length, limit.neededDb) + step,
  ];
  const x = (db: number) => 4 + ((db - low) / (high - low)) * (width - 8);
  const most = Math.max(...counts);
  const [needed, taken] = [x(limit.neededDb), x(limit.takenDb)];
  return (
    <>
      <g fill={token('green')} fillOpacity="0.55">
        {counts.map((count, index) => {
          const height = ((FOOT - TOP) * count) / most;
          const left = x(from + index * step);
          const bar = Math.max(x(from + (index + 1) * step) - left - 1, 1);
          return <rect key={index} x={left} y={FOOT - height} width={bar} height={height} />;
        })}
      </g>
      <path d={`M0 ${FOOT}H${width}`} stroke={token('edge')} />
      <path d={`M${needed} 2V${FOOT}`} stroke={token('oxide')} strokeWidth="2" />
      <path d={`M${taken} 2V${FOOT}`} stroke={token('ink')} strokeWidth="2" />
      <g fontSize="11" fontWeight="700">
        <text {...beside(needed, taken, width, WORDS.needed)} y={11} fill={token('oxide')}>
          {`needed ${fixed(limit.neededDb)}`}
        </text>
        <text {...beside(taken, needed, width, WORDS.taken)} y={11} fill={token('ink')}>
          {fixed(limit.takenDb)}
        </text>
      </g>
      <g fontSize="10.5" fontWeight="600" fill={token('ink2')} textAnchor="middle">
        {axisFigures(low, high).map((db) => (
          <g key={db}>
            <path d={`M${x(db)} ${FOOT}v3`} stroke={token('edge')} />
            <text x={x(db)} y={HEIGHT - 3}>
              {fixed(db, Number.isInteger(db) ? 0 : 1)}
            </text>
          </g>
        ))}
      </g>
    </>
  );
}

/** How a thousand builds scatter at the tightest limit; the sentence says it first to those who do not see it. */
export function SpreadHistogram({ limit }: { limit: JudgedLimit }) {
  const [frame, width] = useWidth<HTMLDivElement>(255);
  const words = spreadWords(limit);
  return (
    <Box component="section" aria-label="Spread of the builds" sx={{ minHeight: 136 }}>
      <Typography
        variant="h3"
        component="h2"
        sx={{ pb: '5px', borderBottom: '1px solid', borderColor: 'token.ink' }}
      >
        Rejection at {megahertz(limit.hertz)} MHz, 1,000 builds
      </Typography>
      <Box ref={frame} sx={{ pt: '6px' }}>
        <svg
          width={width}
          height={HEIGHT}
          style={{ display: 'block' }}
          role="img"
          aria-label={words ?? 'The builds are being worked out'}
        >
          {limit.builds && <Bars limit={limit} builds={limit.builds} width={width} />}
        </svg>
      </Box>
      <Typography variant="small" component="p" sx={{ m: 0, mt: '4px' }}>
        {words ?? 'Working out the builds.'}
      </Typography>
    </Box>
  );
}
