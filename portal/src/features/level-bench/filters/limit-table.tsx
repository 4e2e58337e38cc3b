import Box from '@mui/material/Box';
import { fixed } from '../../../lib/text';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { usePhone } from '../../../shared-ui/use-phone';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { inHand, type JudgedLimit } from './judged';
import { smallTable } from './small-table';
import { inHandWords, megahertz } from './words';

function Verdict({ limit: { verdict } }: { limit: JudgedLimit }) {
  const { short, words } = VERDICTS[verdict];
  if (short === words) return <VerdictLine verdict={verdict} />;
  return (
    <VerdictLine verdict={verdict}>
      <span aria-hidden>{short}</span>
      <VisuallyHidden>{words}</VisuallyHidden>
    </VerdictLine>
  );
}

/** The limits on a phone, the worst first. */
function LimitRows({ limits }: { limits: readonly JudgedLimit[] }) {
  return (
    <Box component="ul" aria-label="Limits" sx={{ m: 0, p: 0, listStyle: 'none' }}>
      {[...limits]
        .sort((a, b) => inHand(a) - inHand(b))
        .map((limit) => (
          <Box
            component="li"
            key={limit.hertz}
            sx={{ py: '8px', borderBottom: '1px solid', borderColor: 'token.rule' }}
          >
            <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: '12px' }}>
              <span>
                <b>{megahertz(limit.hertz)}</b> {limit.name}
              </span>
              <Verdict limit={limit} />
            </Box>
            <Box sx={{ typography: 'small', color: 'token.ink2' }}>
              {fixed(limit.takenDb)} taken, {fixed(limit.neededDb)} needed: {inHandWords(limit)}
            </Box>
          </Box>
        ))}
    </Box>
  );
}

/** What is needed, what is taken, and by the worst build. */
export function LimitTable({ limits }: { limits: readonly JudgedLimit[] }) {
  if (usePhone()) return <LimitRows limits={limits} />;
  return (
    <Box component="table" aria-label="Limits" sx={smallTable(34)}>
      <thead>
        <tr>
          <th scope="col">MHz</th>
          <th scope="col">Needed</th>
          <th scope="col">Taken</th>
          <th scope="col">Worst</th>
          <th scope="col">
            <VisuallyHidden>Verdict</VisuallyHidden>
          </th>
        </tr>
      </thead>
      <tbody>
        {limits.map((limit) => (
          <tr key={limit.hertz}>
            <th scope="row">{megahertz(limit.hertz)}</th>
            <td>{fixed(limit.neededDb)}</td>
            <td>
              <b>{fixed(limit.takenDb)}</b>
            </td>
            <td>{limit.worstDb !== undefined && fixed(limit.worstDb)}</td>
            <td>
              <Verdict limit={limit} />
            </td>
          </tr>
        ))}
      </tbody>
    </Box>
  );
}
