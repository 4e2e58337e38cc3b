import Box from '@mui/material/Box';
import { fixed } from '../../../lib/text';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { ResponseRow } from './response-rows';
import { smallTable } from './small-table';
import { megahertz } from './words';

const span = (from: number | undefined, to: number | undefined): string =>
  from === undefined || to === undefined ? '' : `${fixed(from)} to ${fixed(Math.min(to, 99.9))}`;

/** The plot as a table. */
export function ResponseTable({ rows }: { rows: readonly ResponseRow[] }) {
  return (
    <Box tabIndex={0} role="group" aria-label="Response as a table" sx={{ overflowX: 'auto' }}>
      <Box component="table" aria-label="Response" sx={smallTable(30)}>
        <thead>
          <tr>
            {[
              'MHz',
              'Gain, dB',
              '95 % between',
              'Return loss, dB',
              '95 % between',
              'Needed',
              'Worst',
              'Verdict',
            ].map((header, index) => (
              <th key={index} scope="col">
                {header}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(
            ({ hertz, gainDb, gainFromDb, gainToDb, returnLossDb, returnFromDb, returnToDb, limit }) => (
              <tr key={hertz}>
                <th scope="row">{megahertz(hertz, 2)}</th>
                <td>{fixed(gainDb, gainDb > -1 ? 2 : 1)}</td>
                <td>{span(gainFromDb, gainToDb)}</td>
                <td>{fixed(Math.min(returnLossDb, 99.9))}</td>
                <td>{span(returnFromDb, returnToDb)}</td>
                <td>{limit && fixed(limit.neededDb)}</td>
                <td>{limit?.worstDb !== undefined && fixed(limit.worstDb)}</td>
                <td>
                  {limit && (
                    <VerdictLine verdict={limit.verdict}>{VERDICTS[limit.verdict].short}</VerdictLine>
                  )}
                </td>
              </tr>
            ),
          )}
        </tbody>
      </Box>
    </Box>
  );
}
