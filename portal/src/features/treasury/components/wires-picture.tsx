import Box from '@mui/material/Box';
import { token } from '../../../shared-ui/tokens';
import { GAP, pathOf, ROW, type Wire, type WireKind } from '../wires';

const LOOK: Record<WireKind, { stroke: string; strokeWidth: number }> = {
  matched: { stroke: token('green'), strokeWidth: 1.4 },
  chosen: { stroke: token('green'), strokeWidth: 3 },
  none: { stroke: token('copper'), strokeWidth: 1.6 },
};

/** For the eye only: what a wire says stands in words in each row. */
export function WiresPicture({ wires, rows }: { wires: readonly Wire[]; rows: number }) {
  return (
    <Box
      component="svg"
      aria-hidden
      width={GAP}
      height={rows * ROW}
      sx={{ display: { xs: 'none', lg: 'block' } }}
    >
      {wires.map((wire) => (
        <g key={wire.key} {...LOOK[wire.kind]} fill="none">
          <path d={pathOf(wire)} />
          {wire.kind !== 'none' && (
            <g fill={token('paper')}>
              <circle cx={4} cy={wire.from * ROW + ROW / 2} r={3} />
              <circle cx={GAP - 4} cy={(wire.to ?? 0) * ROW + ROW / 2} r={3} />
            </g>
          )}
        </g>
      ))}
    </Box>
  );
}
