import Box from '@mui/material/Box';
import { Axis } from './axis';
import { Columns } from './columns';
import type { LevelPoint } from './level-point';
import { levelRows } from './level-rows';
import { GUTTER, levelToY, rangeOf } from './level-scale';
import { summary } from './level-words';
import { useWidth } from './use-width';

/** The level diagram as a picture: no switch, no keyboard, one sentence for a screen reader. */
export function LevelPicture({ points }: { points: readonly LevelPoint[] }) {
  const [frame, frameWidth] = useWidth<HTMLDivElement>(760);
  const rows = levelRows(points);
  const range = rangeOf(rows);
  const y = levelToY(range);
  return (
    <Box
      ref={frame}
      role="img"
      aria-label={summary(rows)}
      sx={{ display: 'flex', width: '100%', overflow: 'hidden' }}
    >
      <Axis range={range} y={y} />
      <Columns {...{ rows, range, y }} width={frameWidth - GUTTER} />
    </Box>
  );
}
