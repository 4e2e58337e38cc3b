import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { dayText } from '../../../lib/club-time-text';
import { capital } from '../../../lib/text';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { tierPeopleQuery, type PersonOnTier } from '../api/tiers';

/** Who is on which tier, by name; those on none stand out. */
export function TierPeople() {
  const query = useQuery(tierPeopleQuery);
  const { items = [], total = 0 } = query.data ?? {};
  return (
    <section aria-labelledby="tier-people">
      <SectionHeading
        id="tier-people"
        end={query.data && (total > items.length ? `${items.length} of ${total}` : total)}
      >
        Who is on which
      </SectionHeading>
      {query.isPending && <LoadingBars rows={6} label="Loading who is on which tier" />}
      {query.isError && <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />}
      <Box component="ul" aria-labelledby="tier-people" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {items.map((person) => (
          <Row key={person.personId} person={person} />
        ))}
      </Box>
    </section>
  );
}

function Row({ person: { personName, tierName, coming } }: { person: PersonOnTier }) {
  return (
    <Box
      component="li"
      sx={{
        display: 'flex',
        justifyContent: 'space-between',
        gap: '10px',
        py: '8px',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <span>{personName}</span>
      <Box sx={{ textAlign: 'right' }}>
        <Box component="b" sx={{ color: tierName ? 'token.ink' : 'token.copper' }}>
          {tierName ? capital(tierName) : 'None'}
        </Box>
        {coming && (
          <Box sx={{ typography: 'small', color: 'token.ink2' }}>
            {capital(coming.tierName)} from {dayText(coming.fromOn).slice(4)}
          </Box>
        )}
      </Box>
    </Box>
  );
}
