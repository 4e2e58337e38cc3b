import { fixed } from '../../../lib/text';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token } from '../../../shared-ui/tokens';
import type { BandPicture } from './band';

const HEIGHT = 92;
const TOP = 26;
const FOOT = 62;
/** So many times the emission's own width is drawn to each side of it. */
const AROUND = 4;
/** Two labels nearer than this would meet; the dial's frequency stands under its line anyway. */
const LABEL_ROOM = 64;

const megahertz = (hertz: number): string => fixed(hertz / 1e6, 4);

function spoken({ lowHertz, highHertz, band }: BandPicture): string {
  const emission = `The emission from ${megahertz(lowHertz)} to ${megahertz(highHertz)} MHz`;
  return band
    ? `${emission}; the ${band.name} band goes from ${megahertz(band.lowHertz)} to ${megahertz(band.highHertz)} MHz.`
    : `${emission}.`;
}

/** What the emission occupies, enlarged, over the band it lies in; an edge of the band in sight is a limit. */
export function BandDrawing({ picture }: { picture: BandPicture }) {
  const [frame, width] = useWidth<HTMLDivElement>(760);
  const { lowHertz, highHertz, carrierHertz, band } = picture;
  const own = highHertz - lowHertz;
  const [from, to] = [lowHertz - AROUND * own, highHertz + AROUND * own];
  const x = (hertz: number) => ((Math.min(Math.max(hertz, from), to) - from) / (to - from)) * width;
  const edges = band ? [band.lowHertz, band.highHertz].filter((edge) => edge > from && edge < to) : [];
  return (
    <div ref={frame}>
      <svg
        width={width}
        height={HEIGHT}
        role="img"
        aria-label={spoken(picture)}
        fill="none"
        fontSize="11"
        textAnchor="middle"
      >
        {band && (
          <rect
            x={x(band.lowHertz)}
            y={TOP}
            width={Math.max(0, x(band.highHertz) - x(band.lowHertz))}
            height={FOOT - TOP}
            fill={token('green')}
            fillOpacity="0.2"
          />
        )}
        <path d={`M0 ${FOOT}H${width}`} stroke={token('ink')} strokeWidth="1.5" />
        <rect
          x={x(lowHertz)}
          y={TOP + 8}
          width={x(highHertz) - x(lowHertz)}
          height={FOOT - TOP - 8}
          fill={token('ink')}
          fillOpacity="0.75"
        />
        <path
          d={`M${x(carrierHertz)} ${TOP}V${FOOT}`}
          stroke={token('copper')}
          strokeWidth="2"
          strokeDasharray="3 2"
        />
        {edges.every((edge) => Math.abs(x(edge) - x(carrierHertz)) > LABEL_ROOM) && (
          <text x={x(carrierHertz)} y={TOP - 8} fontWeight="700" fill={token('copper')}>
            dial
          </text>
        )}
        {edges.map((edge) => (
          <g key={edge}>
            <path d={`M${x(edge)} ${TOP - 6}V${FOOT + 6}`} stroke={token('oxide')} strokeWidth="2.4" />
            <text x={x(edge)} y={TOP - 10} fontWeight="700" fill={token('oxide')}>
              {`edge ${megahertz(edge)}`}
            </text>
          </g>
        ))}
        <g fontWeight="600" fill={token('ink2')}>
          <text x={x(lowHertz)} y={FOOT + 18} textAnchor="end">
            {megahertz(lowHertz)}
          </text>
          <text x={x(highHertz)} y={FOOT + 18} textAnchor="start">
            {megahertz(highHertz)}
          </text>
        </g>
      </svg>
    </div>
  );
}
