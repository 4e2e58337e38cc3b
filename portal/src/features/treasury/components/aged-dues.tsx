import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatAmount, formatMoney } from '../../../lib/money';
import { capital, countWord } from '../../../lib/text';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { token } from '../../../shared-ui/tokens';
import type { Summary } from '../api/treasury';

type Band = Summary['aged'][number];

const HATCH = `repeating-linear-gradient(135deg, ${token('brassFill')} 0 2px, transparent 2px 6px)`;

/** Not due = green, up to 60 days = brass hatch, over 60 = oxide solid: fill and colour both tell. */
function fillOf(age: Band['age']) {
  if (age === 'not yet due') return { backgroundColor: 'token.green' };
  if (age === '1 to 30 days late' || age === '31 to 60')
    return { background: HATCH, border: '1px solid', borderColor: 'token.brass' };
  return { backgroundColor: 'token.oxide' };
}

export function AgedDues({ summary }: { summary: Summary }) {
  const { aged, openCount, openMinor, lateMinor, latePeople, currency } = summary;
  const most = Math.max(...aged.map((band) => band.openMinor), 1);
  const people = `${countWord(latePeople)} ${latePeople === 1 ? 'person' : 'people'}`;
  return (
    <Box component="section" aria-labelledby="aged">
      <SectionHeading id="aged" end={`${openCount} open, ${formatMoney(openMinor, currency)}`}>
        Aged dues
      </SectionHeading>
      <Box component="table" aria-labelledby="aged" sx={TABLE}>
        <thead>
          <tr>
            <th scope="col">Age</th>
            <th scope="col">Invoices</th>
            <th scope="col">Amount</th>
            <td />
          </tr>
        </thead>
        <tbody>
          {aged.map((band) => (
            <tr key={band.age}>
              <th scope="row">{capital(band.age)}</th>
              <td>{band.count}</td>
              <td>
                <b>{formatAmount(band.openMinor)}</b>
              </td>
              <td aria-hidden>
                <Box sx={{ height: 10, width: `${(band.openMinor / most) * 100}%`, ...fillOf(band.age) }} />
              </td>
            </tr>
          ))}
        </tbody>
      </Box>
      <Typography variant="small" component="p" sx={{ m: '8px 0 0', color: 'token.ink2' }}>
        {lateMinor === 0 ? 'Nothing is late.' : `${formatMoney(lateMinor, currency)} is late, ${people}.`}
      </Typography>
    </Box>
  );
}

const TABLE = {
  width: '100%',
  borderCollapse: 'collapse',
  '& th, & td': {
    height: 37,
    p: '4px 10px 4px 0',
    borderBottom: `1px solid ${token('rule')}`,
    fontWeight: 400,
  },
  '& th': { textAlign: 'left', whiteSpace: 'nowrap' },
  '& td:nth-of-type(1), & td:nth-of-type(2), & thead th:not(:first-of-type)': { textAlign: 'right' },
  '& td:last-child': { width: '30%', pr: 0 },
  '& thead th, & thead td': {
    height: 28,
    color: 'token.ink2',
    fontSize: '0.75rem',
    fontWeight: 600,
    borderBottomColor: token('ink'),
  },
} as const;
