import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { useMe } from '../../../api-client/session';
import { dateText } from '../../../lib/club-time-text';
import { capital, listText } from '../../../lib/text';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { ThemeChoice } from '../../../shared-ui/theme-choice';
import { myClearancesQuery } from '../api/clearances';

/** Who the portal takes you for, what you are cleared on, and how it looks on this device. */
export default function YouPage() {
  const me = useMe();
  return (
    <>
      <PageTitle tab="You">
        <b>{me.name}</b>
      </PageTitle>
      <Typography sx={{ color: 'token.ink2' }}>{me.email}</Typography>
      <Typography sx={{ color: 'token.ink2' }}>{capital(listText(me.roles))}</Typography>
      <Box sx={{ display: 'grid', gridTemplateColumns: { md: '1fr 1fr' }, gap: '28px 30px', mt: '24px' }}>
        <section>
          <SectionHeading>Clearances</SectionHeading>
          <Clearances />
        </section>
        <section>
          <SectionHeading>On this device</SectionHeading>
          <Box sx={{ mt: '12px', maxWidth: 360 }}>
            <ThemeChoice />
          </Box>
        </section>
      </Box>
    </>
  );
}

function Clearances() {
  const clearances = useQuery(myClearancesQuery);
  if (clearances.isPending) return <LoadingBars rows={3} label="Loading clearances" />;
  if (clearances.isError)
    return <ProblemAlert error={clearances.error} onRetry={() => void clearances.refetch()} />;
  if (clearances.data.length === 0)
    return <EmptyState title="No clearances yet">A steward clears you on a kind of instrument.</EmptyState>;
  return clearances.data.map(({ id, kindName, until, holds }) => (
    <Box key={id} sx={{ py: '10px', borderBottom: '1px solid', borderColor: 'token.rule' }}>
      <b>{kindName}</b>
      <Typography variant="small" sx={{ display: 'block', color: 'token.ink2' }}>
        {holds ? untilText(until) : 'Has run out. Ask a steward.'}
      </Typography>
    </Box>
  ));
}

const untilText = (until: string | null): string => (until ? `Until ${dateText(until)}` : 'Without an end');
