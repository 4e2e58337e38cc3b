import Box from '@mui/material/Box';
import { useEffect, useMemo, useRef } from 'react';
import { plusMinus, signed } from '../../lib/text';
import { StateMark, type ShapeName } from '../states/shape';
import { VERDICTS } from '../states/state-words';
import type { TokenName } from '../tokens';
import { WindowBar } from '../window-bar';
import type { LevelBeingEntered, LevelPoint } from './level-point';
import { levelRows, type LevelRow } from './level-rows';
import { STRIP_DB } from './level-scale';
import { spokenRow } from './level-words';
import { SmallDrawing } from './small-drawing';

interface LevelDiagramPhoneProps {
  points: readonly LevelPoint[];
  entered?: LevelBeingEntered;
  currentId?: string;
  onOpen: (pointId: string) => void;
}

function markOf({ measured, isBeingEntered, verdict }: LevelRow): { name: ShapeName; colour: TokenName } {
  if (measured?.isWithMentor && !isBeingEntered) return { name: 'half', colour: 'trace' };
  if (!verdict) return { name: 'ring', colour: 'ink3' };
  return { name: VERDICTS[verdict].shape, colour: VERDICTS[verdict].colour };
}

function Figures({ point, measured }: LevelRow) {
  return measured ? (
    <>
      {signed(point.planDbm)} <b>{signed(measured.levelDbm)}</b> {plusMinus(measured.expandedUncertaintyDb)}
    </>
  ) : (
    <>
      {signed(point.planDbm)} {plusMinus(point.toleranceDb)}
    </>
  );
}

function Row({ row, isCurrent, onOpen }: { row: LevelRow; isCurrent: boolean; onOpen: () => void }) {
  const { point, measured, offPlanDb, isBeingEntered } = row;
  const mark = markOf(row);
  return (
    <Box
      component="button"
      type="button"
      aria-label={`Stage ${point.stageNumber}. ${spokenRow(row)}`}
      aria-current={isCurrent || undefined}
      onClick={onOpen}
      sx={{
        display: 'grid',
        gridTemplateColumns: '24px 1fr 100px 24px',
        alignItems: 'center',
        gap: '8px',
        width: 'calc(100% + 32px)',
        minHeight: 59,
        mx: '-16px',
        px: '16px',
        border: 0,
        borderBottom: '1px solid',
        borderColor: 'token.rule',
        backgroundColor: isCurrent ? 'token.copperTint' : 'transparent',
        color: 'token.ink2',
        font: 'inherit',
        fontSize: '0.78125rem',
        textAlign: 'left',
      }}
    >
      <Box component="span" sx={{ fontWeight: 600 }}>
        {point.stageNumber}
      </Box>
      <Box component="span" sx={{ minWidth: 0, '& b': { color: 'token.ink' } }}>
        <Box
          component="span"
          sx={{ display: 'block', color: 'token.ink', fontSize: '0.875rem', fontWeight: 600 }}
        >
          {point.name}
        </Box>
        <Figures {...row} />
      </Box>
      <WindowBar
        compact
        low={-point.toleranceDb}
        high={point.toleranceDb}
        target={0}
        from={-STRIP_DB}
        to={STRIP_DB}
        unit="dB off plan"
        tone={isBeingEntered ? 'copper' : 'ink'}
        reading={
          measured && offPlanDb !== undefined
            ? { value: offPlanDb, expandedUncertainty: measured.expandedUncertaintyDb }
            : undefined
        }
      />
      <Box component="span" sx={{ justifySelf: 'end', lineHeight: 0, color: `token.${mark.colour}` }}>
        <StateMark name={mark.name} size={16} />
      </Box>
    </Box>
  );
}

/** The diagram's own form on a phone: the stepped line in small, then one row per point, which is also the reading order. */
export function LevelDiagramPhone({ points, entered, currentId, onOpen }: LevelDiagramPhoneProps) {
  const rows = useMemo(() => levelRows(points, entered), [points, entered]);
  const list = useRef<HTMLDivElement>(null);
  useEffect(() => {
    list.current?.querySelector('[aria-current]')?.scrollIntoView?.({ block: 'center' });
  }, [currentId]);
  return (
    <section aria-label="Level diagram">
      <SmallDrawing rows={rows} />
      <Box
        sx={{
          display: 'flex',
          justifyContent: 'space-between',
          pb: '4px',
          borderBottom: '1.5px solid',
          borderColor: 'token.ink',
          typography: 'small',
          color: 'token.ink2',
        }}
      >
        <span>Plan, measured ± at 95 %</span>
        <span>off plan, ± 3 dB</span>
      </Box>
      <div ref={list}>
        {rows.map((row) => (
          <Row
            key={row.point.id}
            row={row}
            isCurrent={row.point.id === currentId}
            onOpen={() => onOpen(row.point.id)}
          />
        ))}
      </div>
    </section>
  );
}
