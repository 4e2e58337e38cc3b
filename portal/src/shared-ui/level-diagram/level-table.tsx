import Box from '@mui/material/Box';
import { fixed, plusMinus, signed } from '../../lib/text';
import { VerdictLine } from '../states/state-line';
import type { LevelRow } from './level-rows';

const HEADS = ['Plan, dBm', 'Measured', 'Off plan', 'Gain', 'Headroom', 'Verdict'];

const Grey = ({ children }: { children: string }) => (
  <Box component="span" sx={{ color: 'token.ink3', fontWeight: 400 }}>
    {children}
  </Box>
);

function Level({ value, within, decimals = 1 }: { value: number; within: number; decimals?: number }) {
  return (
    <>
      <b>{signed(value)}</b>
      <Box component="span" sx={{ display: 'block', color: 'token.ink2' }}>
        {plusMinus(within, decimals)}
      </Box>
    </>
  );
}

function Cells({ row }: { row: LevelRow }) {
  const { point, measured, offPlanDb, gainMeasuredDb, gainPlannedDb, headroomDb, isHeadroomLow, verdict } =
    row;
  return (
    <>
      <th scope="row">{point.name}</th>
      <td>
        <Level value={point.planDbm} within={point.toleranceDb} />
      </td>
      <td>
        {measured ? (
          <Level value={measured.levelDbm} within={measured.expandedUncertaintyDb} />
        ) : (
          <Grey>none</Grey>
        )}
      </td>
      <td>{offPlanDb !== undefined && signed(offPlanDb)}</td>
      <td>
        {gainMeasuredDb !== undefined && signed(gainMeasuredDb)}
        {gainMeasuredDb === undefined && gainPlannedDb !== undefined && <Grey>{signed(gainPlannedDb)}</Grey>}
      </td>
      <td>
        {headroomDb === undefined ? <Grey>no limit</Grey> : fixed(headroomDb)}
        {isHeadroomLow && ', low'}
      </td>
      <td style={{ whiteSpace: 'nowrap' }}>{verdict && <VerdictLine verdict={verdict} />}</td>
    </>
  );
}

interface LevelTableProps {
  rows: readonly LevelRow[];
  /** False beside the drawing, where only a screen reader meets it. */
  isSeen?: boolean;
}

/** Reachable with the keyboard, since it may have to be scrolled sideways. */
const SCROLLER = {
  tabIndex: 0,
  role: 'region',
  'aria-label': 'Levels as a table',
  sx: { overflowX: 'auto' },
};

/** The same rows as the drawing, as a real table. */
export function LevelTable({ rows, isSeen = true }: LevelTableProps) {
  return (
    <Box {...(isSeen && SCROLLER)}>
      <Box
        component="table"
        sx={{
          width: '100%',
          borderCollapse: 'collapse',
          fontSize: '0.8125rem',
          lineHeight: '1.0625rem',
          '& caption': {
            captionSide: 'bottom',
            textAlign: 'left',
            pt: '8px',
            color: 'token.ink2',
            fontSize: '0.78125rem',
          },
          '& th, & td': {
            p: '5px 0 5px 10px',
            textAlign: 'right',
            borderBottom: '1px solid',
            borderColor: 'token.rule',
          },
          '& th:first-of-type': { pl: 0, textAlign: 'left', fontWeight: 600 },
          '& thead th': {
            color: 'token.ink3',
            fontWeight: 600,
            fontSize: '0.71875rem',
            borderColor: 'token.ink',
            verticalAlign: 'bottom',
          },
          '& [data-entering] > *': { backgroundColor: 'token.copperTint' },
        }}
      >
        <caption>
          Grey gains are planned, not measured. Headroom is from the planned level to the stage’s limit.
        </caption>
        <thead>
          <tr>
            <th scope="col">Stage</th>
            {HEADS.map((head) => (
              <th key={head} scope="col">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.point.id} data-entering={row.isBeingEntered || undefined}>
              <Cells row={row} />
            </tr>
          ))}
        </tbody>
      </Box>
    </Box>
  );
}
