import type { LadderElement } from '@ferrite-row/levels';
import { token } from '../../../shared-ui/tokens';

interface NetworkDrawingProps {
  elements: readonly Pick<LadderElement, 'name' | 'place' | 'part'>[];
  /** Written at each element. */
  values: readonly string[];
  ends: readonly [source: string, load: string];
  width: number;
  words: string;
}

const HEIGHT = 128;
const LINE = 46;
const FOOT = 104;
/** Half of a symbol, along the wire. */
const HALF = 26;

/** Four turns. */
const COIL = 'c0 -17 13 -17 13 0'.repeat(4);

/** Along x from −26 to +26; what is not a wire is drawn between. */
const SYMBOLS: Record<LadderElement['part'], string> = {
  inductor: `M${-HALF} 0${COIL}`,
  capacitor: `M${-HALF} 0H-4M-4 -12v24M4 -12v24M4 0H${HALF}`,
};

/** An L-network with its values, source at the left. */
export function NetworkDrawing({ elements, values, ends, width, words }: NetworkDrawingProps) {
  const xOf = (index: number) => (width * (index + 1)) / (elements.length + 1);
  return (
    <svg
      width={width}
      height={HEIGHT}
      role="img"
      aria-label={words}
      fill="none"
      fontSize="13"
      style={{ display: 'block' }}
    >
      <g stroke={token('ink')} strokeWidth="1.5">
        <path d={wires(elements, xOf, width)} />
        {elements.map(({ name, place, part }, index) =>
          place === 'series' ? (
            <path key={name} d={SYMBOLS[part]} transform={`translate(${xOf(index)} ${LINE})`} />
          ) : (
            <path
              key={name}
              d={SYMBOLS[part]}
              transform={`translate(${xOf(index)} ${(LINE + FOOT) / 2}) rotate(90)`}
            />
          ),
        )}
        {[4, width - 4].map((x) => (
          <circle key={x} cx={x} cy={LINE} r="3.5" fill={token('sheet')} />
        ))}
      </g>
      {elements.map(({ name, place }, index) => (
        <g key={name} fill={token('ink')}>
          {place === 'shunt' && <circle cx={xOf(index)} cy={LINE} r="3" />}
          <Label name={name} value={values[index] ?? ''} x={xOf(index)} isSeries={place === 'series'} />
        </g>
      ))}
      <g fontSize="12" fill={token('ink2')}>
        <text x={0} y={LINE + 22}>
          {ends[0]}
        </text>
        <text x={width} y={LINE + 22} textAnchor="end">
          {ends[1]}
        </text>
      </g>
    </svg>
  );
}

function wires(
  elements: NetworkDrawingProps['elements'],
  xOf: (index: number) => number,
  width: number,
): string {
  const cuts = elements.flatMap(({ place }, index) =>
    place === 'series' ? [`H${xOf(index) - HALF}M${xOf(index) + HALF} ${LINE}`] : [],
  );
  const shunts = elements.flatMap(({ place }, index) => {
    if (place === 'series') return [];
    const [x, top, foot] = [xOf(index), (LINE + FOOT) / 2 - HALF, (LINE + FOOT) / 2 + HALF];
    return [`M${x} ${LINE}V${top}M${x} ${foot}V${FOOT + 6}m-9 0h18m-14 4h10m-7 4h4`];
  });
  return `M8 ${LINE}${cuts.join('')}H${width - 8}${shunts.join('')}`;
}

function Label({ name, value, x, isSeries }: { name: string; value: string; x: number; isSeries: boolean }) {
  const small = (
    <tspan fontSize="12" fontWeight="400" fill={token('ink2')}>
      {`${name} `}
    </tspan>
  );
  return isSeries ? (
    <text x={x} y={LINE - 24} textAnchor="middle" fontWeight="700">
      {small}
      {value}
    </text>
  ) : (
    <text x={x + 18} y={(LINE + FOOT) / 2} fontWeight="700">
      {small}
      <tspan x={x + 18} dy="16">
        {value}
      </tspan>
    </text>
  );
}
