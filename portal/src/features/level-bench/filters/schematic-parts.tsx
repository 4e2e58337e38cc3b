import { token } from '../../../shared-ui/tokens';
import type { FittedElement } from '@ferrite-row/levels';
import { valueOf } from './parts';

/** Height of the line in the drawing. */
export const LINE = 46;
const GROUND = 91;

interface PartProps {
  element: FittedElement;
  x: number;
}

const Words = ({ element, x, y }: PartProps & { y: number }) => (
  <text x={x} y={y} textAnchor="middle" fill={token('ink')} stroke="none">
    <tspan fontSize="11" fontWeight="600" fill={token('ink2')}>
      {element.name}{' '}
    </tspan>
    <tspan fontSize="13.5" fontWeight="700">
      {valueOf(element, element.value)}
    </tspan>
  </text>
);

/** A hole in the line, so that the symbol stands in it. */
const Gap = ({ x, half }: { x: number; half: number }) => (
  <path d={`M${x - half} ${LINE}H${x + half}`} stroke={token('sheet')} strokeWidth="4" />
);

/** Four humps along the line. */
function SeriesCoil({ element, x }: PartProps) {
  return (
    <g>
      <Gap x={x} half={28} />
      <path d={`M${x - 28} ${LINE}${'a7 8 0 0 1 14 0'.repeat(4)}`} />
      <Words element={element} x={x} y={22} />
    </g>
  );
}

function SeriesCapacitor({ element, x }: PartProps) {
  return (
    <g>
      <Gap x={x} half={3.5} />
      <path d={`M${x - 3.5} ${LINE - 12}v24M${x + 3.5} ${LINE - 12}v24`} strokeWidth="2" />
      <Words element={element} x={x} y={22} />
    </g>
  );
}

/** A leg to ground; its words stand to the right of it. */
function Leg({ element, x, symbol }: PartProps & { symbol: string }) {
  return (
    <g>
      <circle cx={x} cy={LINE} r="3" fill={token('ink')} stroke="none" />
      <path d={symbol} />
      <path d={`M${x - 10} ${GROUND}h20M${x - 6} ${GROUND + 4}h12M${x - 2} ${GROUND + 8}h4`} />
      <g stroke="none">
        <text x={x + 18} y={LINE + 22} fontSize="11" fontWeight="600" fill={token('ink2')}>
          {element.name}
        </text>
        <text x={x + 18} y={LINE + 38} fontSize="13.5" fontWeight="700" fill={token('ink')}>
          {valueOf(element, element.value)}
        </text>
      </g>
    </g>
  );
}

const ShuntCapacitor = ({ element, x }: PartProps) => (
  <Leg
    element={element}
    x={x}
    symbol={`M${x} ${LINE}v19M${x - 13} ${LINE + 19}h26M${x - 13} ${LINE + 26}h26M${x} ${LINE + 26}V${GROUND}`}
  />
);

const ShuntCoil = ({ element, x }: PartProps) => (
  <Leg element={element} x={x} symbol={`M${x} ${LINE}v5${'a8 4.25 0 0 1 0 8.5'.repeat(4)}V${GROUND}`} />
);

const SYMBOLS = {
  series: { inductor: SeriesCoil, capacitor: SeriesCapacitor },
  shunt: { inductor: ShuntCoil, capacitor: ShuntCapacitor },
} as const;

/** One element, drawn where it stands. */
export function SchematicPart({ element, x }: PartProps) {
  const Symbol = SYMBOLS[element.place][element.part];
  return <Symbol element={element} x={x} />;
}
