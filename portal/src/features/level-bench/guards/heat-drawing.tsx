import { fixed } from '../../../lib/text';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token } from '../../../shared-ui/tokens';
import type { HeatPicture } from './heat';

const HEIGHT = 112;
const LINE = 62;
const EDGE = 42;
const RESISTOR = { width: 0.42, height: 16 };

const spoken = ({ places, watts }: HeatPicture): string =>
  `${fixed(watts)} W of heat on its way: ${places.map(({ name, celsius }) => `${name} ${fixed(celsius, 0)} °C`).join(', ')}.`;

/** The way of the heat: places with their temperature, and between them what holds it back. */
export function HeatDrawing({ picture }: { picture: HeatPicture }) {
  const [frame, width] = useWidth<HTMLDivElement>(760);
  const { places, resistances, greatestJunctionCelsius, watts } = picture;
  const step = (width - 2 * EDGE) / (places.length - 1);
  const x = (index: number) => EDGE + index * step;
  const half = (step * RESISTOR.width) / 2;
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
        <path d={`M${x(0)} ${LINE}H${x(places.length - 1)}`} stroke={token('ink')} strokeWidth="1.5" />
        {resistances.map(({ name, kelvinPerWatt }, index) => {
          const middle = x(index + 0.5);
          return (
            <g key={name}>
              <rect
                x={middle - half}
                y={LINE - RESISTOR.height / 2}
                width={2 * half}
                height={RESISTOR.height}
                fill={token('sheet')}
                stroke={token('ink')}
                strokeWidth="1.5"
              />
              <text x={middle} y={LINE + 26} fontWeight="700" fill={token('ink')}>
                {`${fixed(kelvinPerWatt, 2)} K/W`}
              </text>
              <text x={middle} y={LINE + 42} fontWeight="600" fill={token('ink3')}>
                {`${fixed(kelvinPerWatt * watts)} K`}
              </text>
            </g>
          );
        })}
        {places.map(({ name, celsius }, index) => {
          const isOver = index === 0 && celsius > greatestJunctionCelsius;
          return (
            <g key={name}>
              {isOver ? (
                <rect x={x(index) - 5} y={LINE - 5} width="10" height="10" fill={token('oxide')} />
              ) : (
                <circle cx={x(index)} cy={LINE} r="4" fill={token('ink')} />
              )}
              <text x={x(index)} y={LINE - 34} fontWeight="600" fill={token('ink2')}>
                {name}
              </text>
              <text
                x={x(index)}
                y={LINE - 17}
                fontSize="13"
                fontWeight="700"
                fill={token(isOver ? 'oxide' : 'ink')}
              >
                {`${fixed(celsius, 0)} °C`}
              </text>
            </g>
          );
        })}
      </svg>
    </div>
  );
}
