import { formatQuantity, type FittedLadder } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import { memo } from 'react';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token } from '../../../shared-ui/tokens';
import { layOut } from './schematic-layout';
import { LINE, SchematicPart } from './schematic-parts';
import { valueOf } from './parts';

const HEIGHT = 104;

function Terminal({ x, name, ohms }: { x: number; name: string; ohms: number }) {
  return (
    <g>
      <circle cx={x} cy={LINE} r="3.4" fill={token('sheet')} />
      <g textAnchor="middle" stroke="none">
        <text x={x} y={LINE + 22} fontSize="11" fontWeight="700" fill={token('ink')}>
          {name}
        </text>
        <text x={x} y={LINE + 37} fontSize="11" fill={token('ink2')}>
          {formatQuantity(ohms, 'ohm')}
        </text>
      </g>
    </g>
  );
}

const spoken = (ladder: FittedLadder): string =>
  ladder.elements
    .map(
      (element) =>
        `${element.name} ${valueOf(element, element.value)} ${element.place === 'series' ? 'in the line' : 'to ground'}`,
    )
    .join(', ');

/** The filter as a circuit, from the source to the load, with the parts that will be fitted. */
export const Schematic = memo(function Schematic({ ladder }: { ladder: FittedLadder }) {
  const [frame, frameWidth] = useWidth<HTMLDivElement>(320);
  const { width, from, to, placed } = layOut(ladder, frameWidth);
  return (
    <Box
      ref={frame}
      tabIndex={0}
      role="group"
      aria-label="Circuit; it scrolls where it is wider than the page"
      sx={{
        mt: '10px',
        overflowX: 'auto',
        border: '1px solid',
        borderColor: 'token.rule',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
      }}
    >
      <svg
        width={width}
        height={HEIGHT}
        role="img"
        aria-label={`Source, ${spoken(ladder)}, load`}
        style={{ display: 'block' }}
        fill="none"
        stroke={token('ink')}
        strokeWidth="1.4"
      >
        <path d={`M${from} ${LINE}H${to}`} />
        {placed.map(({ element, x }) => (
          <SchematicPart key={element.name} element={element} x={x} />
        ))}
        <Terminal x={from} name="Source" ohms={ladder.sourceOhms} />
        <Terminal x={to} name="Load" ohms={ladder.loadOhms} />
      </svg>
    </Box>
  );
});
