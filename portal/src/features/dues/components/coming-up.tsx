import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { dayText } from '../../../lib/club-time-text';
import { formatMoney } from '../../../lib/money';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { ReactNode } from 'react';
import type { Invoice, MyDues } from '../api/dues';

interface ComingUpProps {
  invoices: readonly Invoice[];
  dues: MyDues;
  onChoose: (invoiceId: string) => void;
}

/** Raised already and due later, the tier, and how to reach the treasurer. */
export function ComingUp({ invoices, dues, onChoose }: ComingUpProps) {
  const { currency, tier, creditMinor, contactEmail } = dues;
  return (
    <Box component="section" aria-labelledby="coming-up">
      <SectionHeading id="coming-up">Coming up</SectionHeading>
      {invoices.length === 0 && <Row what="Nothing is raised beyond what is shown here." />}
      {invoices.map(({ id, description, openMinor, dueOn }) => (
        <Row
          key={id}
          what={
            <Link component="button" onClick={() => onChoose(id)}>
              {description}
            </Link>
          }
          when={`due ${dayText(dueOn)}`}
          amount={formatMoney(openMinor, currency)}
        />
      ))}
      <Typography variant="small" component="p" sx={{ m: '12px 0 0', color: 'token.ink2' }}>
        {tier && (
          <>
            Tier: <b>{tier.name}</b>, {formatMoney(tier.amountMinor, currency)} for{' '}
            {tier.months === 1 ? 'a month' : `${tier.months} months`}.{' '}
          </>
        )}
        {creditMinor > 0 && (
          <>You have {formatMoney(creditMinor, currency)} on account; it pays the next invoice first. </>
        )}
        {contactEmail && (
          <>
            Money short this winter? <Link href={`mailto:${contactEmail}`}>Write to the treasurer</Link>.
          </>
        )}
      </Typography>
    </Box>
  );
}

function Row({ what, when, amount }: { what: ReactNode; when?: string; amount?: string }) {
  return (
    <Box
      sx={{
        display: 'flex',
        justifyContent: 'space-between',
        gap: '12px',
        py: '7px',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <Box sx={{ minWidth: 0 }}>
        <Box sx={{ fontWeight: amount ? 700 : 400 }}>{what}</Box>
        {when && (
          <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
            {when}
          </Typography>
        )}
      </Box>
      {amount && <b>{amount}</b>}
    </Box>
  );
}
