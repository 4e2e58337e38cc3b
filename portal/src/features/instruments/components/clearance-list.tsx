import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { carryOut } from '../../../api-client/carry-out';
import { dateText } from '../../../lib/club-time-text';
import { counted, listText } from '../../../lib/text';
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
      {byKind(clearances.data ?? []).map(([kindName, given]) => (
        <KindOfClearance key={kindName} kindName={kindName} given={given} />
      ))}
    </section>
  );
}

function byKind(clearances: readonly Clearance[]): [string, Clearance[]][] {
  const kinds = new Map<string, Clearance[]>();
  for (const clearance of clearances) {
    kinds.set(clearance.kindName, [...(kinds.get(clearance.kindName) ?? []), clearance]);
  }
  return [...kinds].sort(([a], [b]) => a.localeCompare(b));
}

/** Who is cleared on one kind: the names in a line, the rows with what can be done to them when it is opened. */
function KindOfClearance({ kindName, given }: { kindName: string; given: readonly Clearance[] }) {
  const ended = given.filter(({ holds }) => !holds).length;
  return (
    <Box component="details" sx={{ borderBottom: '1px solid', borderColor: 'token.rule', py: '8px' }}>
      <Box component="summary" sx={{ minHeight: 28, cursor: 'pointer' }}>
        <b>{kindName}</b>, {counted(given.length, 'person', 'people')}
        {ended > 0 && <Box component="span" sx={{ color: 'token.brass' }}>{`, ${ended} ended`}</Box>}
        <Box sx={{ typography: 'small', color: 'token.ink2' }}>
          {listText(given.filter(({ holds }) => holds).map(({ personName }) => personName))}
        </Box>
      </Box>
      {given.map((clearance) => (
        <ClearanceRow key={clearance.id} clearance={clearance} />
      ))}
    </Box>
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
