import Box from '@mui/material/Box';
import { memo, useId, useState, type KeyboardEvent, type PointerEvent } from 'react';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token } from '../../../shared-ui/tokens';
import type { FilterBuilds } from './builds';
import type { FilterFigures } from './figures';
import type { Judged } from './judged';
import { PlotCursor } from './plot-cursor';
import { AxisFigures, Grid, Lines, Spread, WantedBand } from './plot-layers';
import { Limits, ReturnLossLimit } from './plot-limits';
import { GAIN, GUTTER, HEIGHT, hertzToX, RETURN, xToHertz } from './plot-scale';
import { nextStop, rowAt } from './response-rows';
import { plotSummary, rowWords } from './words';

/** Until it is measured: no wider than a phone, so that nothing sticks out. */
const LEAST_WIDTH = 320;

interface FilterPlotProps {
  figures: FilterFigures;
  judged: Judged;
  built: FilterBuilds | undefined;
  isStale: boolean;
}

/** Gain over return loss on one frequency axis. One tab stop: arrows step along it, H goes to the next limit. */
export const FilterPlot = memo(function FilterPlot({ figures, judged, built, isStale }: FilterPlotProps) {
  const [frame, width] = useWidth<HTMLDivElement>(LEAST_WIDTH);
  const [at, setAt] = useState<number>();
  const row = at === undefined ? undefined : rowAt(figures, judged, built, at);

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = nextStop(figures, at, event.key, event.shiftKey);
    if (next === undefined) return;
    setAt(next);
    event.preventDefault();
  };
  const onPointer = (event: PointerEvent) => {
    const left = event.currentTarget.getBoundingClientRect().left;
    setAt(xToHertz(figures.axis, width, event.clientX - left) || undefined);
  };

  return (
    <Box
      ref={frame}
      role="group"
      tabIndex={0}
      aria-label="Filter plot. Left and Right step along the frequencies, Shift by a tenth, H goes to the next limit."
      onKeyDown={onKeyDown}
      onPointerMove={onPointer}
      onPointerLeave={() => setAt(undefined)}
      onBlur={() => setAt(undefined)}
      sx={{ width: '100%', touchAction: 'pan-y' }}
    >
      <Box sx={{ position: 'relative' }}>
        <Drawing {...{ figures, judged, built, isStale, width }} />
        {row && <PlotCursor row={row} x={hertzToX(figures.axis, width)(row.hertz)} width={width} />}
      </Box>
      <Box role="status" sx={{ minHeight: 36, pl: `${GUTTER}px`, typography: 'small', color: 'token.ink2' }}>
        {row && rowWords(row)}
      </Box>
    </Box>
  );
});

type DrawingProps = FilterPlotProps & { width: number };

/** Drawn anew only when the filter is: the cursor lies over it. */
const Drawing = memo(function Drawing({ figures, judged, built, isStale, width }: DrawingProps) {
  const id = useId();
  const x = hertzToX(figures.axis, width);
  const right = x(figures.axis.endHertz);
  const layer = { figures, x, right };
  const panel = `M${GUTTER} ${GAIN.top - 2}H${right}V${GAIN.bottom}H${GUTTER}zM${GUTTER} ${RETURN.top - 1}H${right}V${RETURN.bottom}H${GUTTER}z`;
  return (
    <svg
      width={width}
      height={HEIGHT}
      role="img"
      aria-label={plotSummary(figures, judged)}
      style={{ display: 'block' }}
    >
      <defs>
        <clipPath id={`${id}-panels`}>
          <path d={panel} />
        </clipPath>
        <pattern
          id={`${id}-hatch`}
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0v5" stroke={token('brassFill')} strokeWidth="1.6" />
        </pattern>
      </defs>
      <Grid {...layer} />
      <AxisFigures {...layer} />
      <WantedBand {...layer} />
      <g clipPath={`url(#${id}-panels)`}>
        {built && <Spread {...{ built, isStale, x }} />}
        <Lines {...layer} />
      </g>
      <Limits {...layer} judged={judged} hatchId={`${id}-hatch`} />
      <ReturnLossLimit figures={figures} judged={judged} x={x} />
    </svg>
  );
});
