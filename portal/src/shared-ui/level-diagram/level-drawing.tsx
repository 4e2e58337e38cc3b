import Box from '@mui/material/Box';
import { useEffect, useMemo, useState, type KeyboardEvent } from 'react';
import { VisuallyHidden } from '../visually-hidden';
import { Axis } from './axis';
import { Columns } from './columns';
import type { LevelRow } from './level-rows';
import { GUTTER, LEAST_COLUMN, levelToY, rangeOf } from './level-scale';
import { spokenRow, summary } from './level-words';
import { useWidth } from './use-width';

interface LevelDrawingProps {
  rows: readonly LevelRow[];
  currentId?: string;
  onOpen?: (id: string) => void;
}

const USUAL_WIDTH = 656;

const nextColumn = (key: string, at: number | undefined, last: number): number | undefined => {
  if (key === 'ArrowRight') return Math.min(last, (at ?? -1) + 1);
  if (key === 'ArrowLeft') return Math.max(0, (at ?? 1) - 1);
  if (key === 'Home') return 0;
  return key === 'End' ? last : undefined;
};

/** The drawing itself: one tab stop, arrows step through the columns, Enter opens one. */
export function LevelDrawing({ rows, currentId, onOpen }: LevelDrawingProps) {
  const [frame, frameWidth] = useWidth<HTMLDivElement>(USUAL_WIDTH);
  const [focused, setFocused] = useState<number>();
  const range = useMemo(() => rangeOf(rows), [rows]);
  const y = levelToY(range);
  const width = Math.max(frameWidth - GUTTER, LEAST_COLUMN * rows.length);
  const column = width / rows.length;
  const currentAt = rows.findIndex(({ point }) => point.id === currentId);
  const shown = focused ?? currentAt;

  useEffect(() => {
    // Where the columns scroll, the one that matters is brought to the middle.
    const scroller = frame.current?.querySelector('[data-scroller]');
    if (scroller && shown >= 0) scroller.scrollLeft = (shown + 0.5) * column - scroller.clientWidth / 2;
  }, [frame, shown, column]);

  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = nextColumn(event.key, focused ?? (currentAt >= 0 ? currentAt : undefined), rows.length - 1);
    const row = focused === undefined ? undefined : rows[focused];
    if (next !== undefined) setFocused(next);
    else if (event.key === 'Enter' && row) onOpen?.(row.point.id);
    else return;
    event.preventDefault();
  };

  return (
    <Box
      ref={frame}
      role="group"
      tabIndex={0}
      aria-label="Level diagram. Left and Right step through the stages."
      onKeyDown={onKeyDown}
      onBlur={() => setFocused(undefined)}
      sx={{ display: 'flex', position: 'relative', width: '100%' }}
    >
      <Axis range={range} y={y} />
      <Box
        data-scroller
        role="img"
        aria-label={summary(rows)}
        sx={{ flex: 1, minWidth: 0, overflowX: 'auto' }}
      >
        <Columns {...{ rows, width, range, y, currentId, focused }} onPress={onOpen} />
      </Box>
      <VisuallyHidden>
        <span role="status">{focused !== undefined && rows[focused] ? spokenRow(rows[focused]) : ''}</span>
      </VisuallyHidden>
    </Box>
  );
}
