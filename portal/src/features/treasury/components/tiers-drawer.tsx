import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { tiersQuery } from '../api/tiers';
import { AddTier } from './add-tier';
import { GiveTier } from './give-tier';
import { TierList } from './tier-list';
import { TierPeople } from './tier-people';

interface TiersDrawerProps {
  currency: string;
  onClose: () => void;
}

/** What dues there are, who is on which, and giving somebody another. */
export function TiersDrawer({ currency, onClose }: TiersDrawerProps) {
  const tiers = useQuery(tiersQuery);
  return (
    <DockedDrawer open title="Tiers" width={400} onClose={onClose}>
      <Box sx={{ display: 'grid', gap: '24px' }}>
        {tiers.isPending && <LoadingBars rows={4} label="Loading the tiers" />}
        {tiers.isError && <ProblemAlert error={tiers.error} onRetry={() => void tiers.refetch()} />}
        {tiers.data?.length === 0 && (
          <EmptyState title="No tier yet. Add one.">
            A tier is what a kind of member pays, and for how many months.
          </EmptyState>
        )}
        {tiers.data && tiers.data.length > 0 && (
          <>
            <TierList tiers={tiers.data} currency={currency} />
            <GiveTier tiers={tiers.data} />
          </>
        )}
        {tiers.data && <AddTier currency={currency} />}
        {tiers.data && tiers.data.length > 0 && <TierPeople />}
      </Box>
    </DockedDrawer>
  );
}
