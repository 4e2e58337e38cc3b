import type { FittedLadder } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { memo } from 'react';
import { farOffWords, partCount, partRows } from './parts';
import type { FilterValues } from './inputs';
import { smallTable } from './small-table';

interface PartsTableProps {
  ladder: FittedLadder;
  toleranceRel: number;
  /** Of a band-pass: whether its resonators are. */
  trimmed?: FilterValues['trimmed'];
}

/** What the book says, and what will be fitted. */
export const PartsTable = memo(function PartsTable({ ladder, toleranceRel, trimmed }: PartsTableProps) {
  return (
    <Box component="section" aria-label="Parts to fit" sx={{ mb: '18px' }}>
      <Typography
        variant="h3"
        component="h2"
        sx={{ pb: '4px', borderBottom: '1px solid', borderColor: 'token.ink' }}
      >
        Parts to fit
      </Typography>
      <Box component="table" aria-label="Parts to fit" sx={smallTable(27)}>
        <thead>
          <tr>
            <th scope="col">
              <Box component="span" sx={{ fontWeight: 400 }}>
                Part
              </Box>
            </th>
            <th scope="col">Exact</th>
            <th scope="col">Nearest to fit</th>
          </tr>
        </thead>
        <tbody>
          {partRows(ladder).map(({ names, exact, nearest }) => (
            <tr key={names}>
              <Box component="th" scope="row" sx={{ '&&': { whiteSpace: 'normal' } }}>
                {names}
              </Box>
              <Box component="td" sx={{ color: 'token.ink2' }}>
                {exact}
              </Box>
              <Box component="td" sx={{ '&&': { fontWeight: 700, whiteSpace: 'normal' } }}>
                {nearest}
              </Box>
            </tr>
          ))}
        </tbody>
      </Box>
      <Typography variant="small" component="p" sx={{ m: 0, mt: '6px', color: 'token.ink3' }}>
        {farOffWords(ladder, toleranceRel)} {partCount(ladder)}; two values with a plus lie in parallel.
        {trimmed === 'no' &&
          ' A trimmer across each resonator takes up what the parts scatter, common practice; the builds here are without.'}
        {trimmed === 'yes' &&
          ' Each resonator has a trimmer in place of a part of its capacitor: the builds here are turned to the centre.'}
      </Typography>
    </Box>
  );
});
