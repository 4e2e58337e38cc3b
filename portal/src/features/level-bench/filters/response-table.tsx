import Box from '@mui/material/Box';
import { fixed } from '../../../lib/text';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { ResponseRow } from './response-rows';
import { smallTable } from './small-table';
import { megahertz } from './words';

const HEADERS = ['MHz', 'Gain', '95 % between', 'Return loss', '95 % between', 'Needed', 'Worst', 'Verdict'];

/** A loss of a few tenths is told to the hundredth. */
const gain = (db: number): string => fixed(db, db > -1 ? 2 : 1);

const returnLoss = (db: number): string => fixed(Math.min(db, 99.9));

const span = (from: number | undefined, to: number | undefined, words: (db: number) => string): string =>
  from === undefined || to === undefined ? '' : `${words(from)} to ${words(to)}`;

/** The plot as a table, in dB. */
export function ResponseTable({ rows }: { rows: readonly ResponseRow[] }) {
  return (
    <Box tabIndex={0} role="group" aria-label="Response as a table" sx={{ overflowX: 'auto' }}>
      <Box component="table" aria-label="Response" sx={smallTable(30)}>
        <thead>
          <tr>
            {HEADERS.map((header, index) => (
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
                <td>{gain(gainDb)}</td>
                <td>{span(gainFromDb, gainToDb, gain)}</td>
                <td>{returnLoss(returnLossDb)}</td>
                <td>{span(returnFromDb, returnToDb, returnLoss)}</td>
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
