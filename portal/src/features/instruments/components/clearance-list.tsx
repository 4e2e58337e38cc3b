import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { carryOut } from '../../../api-client/carry-out';
import { dateText } from '../../../lib/club-time-text';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useToast } from '../../../shared-ui/toasts';
import {
  clearancesQuery,
  useEndClearance,
  useGrantClearance,
  type Clearance,
  type Instrument,
} from '../api/instruments';
import { ClearanceForm } from './clearance-form';

/** Who is cleared on what, and the form that clears somebody. */
export function ClearanceList({ instruments }: { instruments: readonly Instrument[] }) {
  const clearances = useQuery(clearancesQuery);
  const failed = clearances.isError && !clearances.data;
  return (
    <section aria-label="Clearances">
      <SectionHeading end={clearances.data && `${clearances.data.length} given`}>Clearances</SectionHeading>
      <ClearanceForm instruments={instruments} />
      {clearances.isPending && <LoadingBars rows={4} label="Loading clearances" />}
      {failed && <ProblemAlert error={clearances.error} onRetry={() => void clearances.refetch()} />}
      {clearances.data?.map((clearance) => (
        <ClearanceRow key={clearance.id} clearance={clearance} />
      ))}
    </section>
  );
}

function ClearanceRow({ clearance }: { clearance: Clearance }) {
  const end = useEndClearance();
  const grant = useGrantClearance();
  const say = useToast();
  const { id, personId, personName, kindId, kindName, grantedBy, until, holds } = clearance;
  const again = () => grant.mutate({ personId, kindId, ...(until && { until }) });
  const takeBack = () =>
    carryOut(end, id, {
      onSuccess: () => say(`${personName} is no longer cleared on ${kindName}.`, holds ? again : undefined),
    });
  const term = until ? `${holds ? 'until' : 'ended'} ${dateText(until)}` : 'no end';
  return (
    <Box
      sx={{
        display: 'flex',
        alignItems: 'center',
        gap: '10px',
        minHeight: 52,
        borderBottom: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      <Box sx={{ flex: 1, minWidth: 0 }}>
        <b>{personName}</b>, {kindName}
        <Box sx={{ typography: 'small', color: holds ? 'token.ink2' : 'token.brass' }}>
          By {grantedBy}, {term}
        </Box>
        {end.isError && <ProblemAlert error={end.error} title="It still stands." />}
      </Box>
      <Button
        size="small"
        loading={end.isPending}
        aria-label={`Take back ${personName}, ${kindName}`}
        onClick={takeBack}
      >
        Take back
      </Button>
    </Box>
  );
}
