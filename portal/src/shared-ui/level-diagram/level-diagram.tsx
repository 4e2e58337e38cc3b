import Box from '@mui/material/Box';
import { useMemo } from 'react';
import { SectionHeading } from '../section-heading';
import { usePreference } from '../use-preference';
import { ViewSwitch } from '../view-switch';
import { VisuallyHidden } from '../visually-hidden';
import { LevelDrawing } from './level-drawing';
import type { LevelBeingEntered, LevelPoint } from './level-point';
import { levelRows } from './level-rows';
import { LevelTable } from './level-table';
import { Legend } from './legend';

interface LevelDiagramProps {
  /** In signal order. */
  points: readonly LevelPoint[];
  /** The reading on its way, while somebody types. */
  entered?: LevelBeingEntered;
  currentId?: string;
  /** Opens the point's stage. */
  onOpen?: (pointId: string) => void;
}

/** Levels along the chain: plan, limits, readings. The table is always there for a screen reader, and one switch away for the eye. */
export function LevelDiagram({ points, entered, currentId, onOpen }: LevelDiagramProps) {
  const [view, setView] = usePreference('level-view', ['diagram', 'table']);
  const rows = useMemo(() => levelRows(points, entered), [points, entered]);
  const isTable = view === 'table';
  return (
    <Box
      component="section"
      aria-label="Level diagram"
      onKeyDown={(event) => {
        const isPlainT = event.key.toLowerCase() === 't' && !event.ctrlKey && !event.metaKey && !event.altKey;
        if (isPlainT) setView(isTable ? 'diagram' : 'table');
      }}
    >
      <SectionHeading end={<ViewSwitch value={view} drawing="diagram" words="Diagram" onChange={setView} />}>
        Level diagram
      </SectionHeading>
      {isTable ? (
        <LevelTable rows={rows} />
      ) : (
        <>
          <Legend isEntering={entered !== undefined} hasMeasured={rows.some(({ measured }) => measured)} />
          <LevelDrawing rows={rows} currentId={currentId} onOpen={onOpen} />
          <VisuallyHidden as="div">
            <LevelTable rows={rows} isSeen={false} />
          </VisuallyHidden>
        </>
      )}
    </Box>
  );
}
