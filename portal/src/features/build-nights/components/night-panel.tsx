import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useMe } from '../../../api-client/session';
import { clubDay } from '../../../lib/club-time';
import { formatSpan, longDayText } from '../../../lib/club-time-text';
import { Banner } from '../../../shared-ui/banner';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import type { NightDetail } from '../api/nights';
import { nightQuery } from '../api/nights';
import { benchWords, lineWords } from '../night-words';
import { CancelDialog } from './cancel-dialog';
import { ComingButton } from './coming-button';
import { NightGuests, NightTeam } from './night-people';
import { PlaceBar } from './place-bar';
import { StandingLine } from './standing-line';

interface NightPanelProps {
  nightId: string;
  /** Opens the form for a mentor. */
  onChange: (nightId: string) => void;
}

/** The one night that is open: when and where, who is coming, who waits, and what may be done about it. */
export function NightPanel({ nightId, onChange }: NightPanelProps) {
  const query = useQuery(nightQuery(nightId));
  return (
    <Box
      component="section"
      aria-label="The night that is open"
      sx={{
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        p: '12px 16px 14px',
      }}
    >
      {query.isPending && <LoadingBars rows={5} label="Loading the night" />}
      {query.isError && <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />}
      {query.data && <Opened night={query.data} onChange={onChange} />}
    </Box>
  );
}

function Opened({ night, onChange }: { night: NightDetail; onChange: (nightId: string) => void }) {
  return (
    <Box
      sx={{
        display: 'grid',
        gap: '16px 22px',
        gridTemplateColumns: {
          xs: 'minmax(0, 1fr)',
          sm: 'repeat(2, minmax(0, 1fr))',
          md: '236px minmax(0, 1.5fr) minmax(0, 1fr)',
        },
      }}
    >
      <NightFacts night={night} onChange={onChange} />
      <NightGuests night={night} />
      <NightTeam night={night} />
    </Box>
  );
}

function NightFacts({ night, onChange }: { night: NightDetail; onChange: (nightId: string) => void }) {
  const { series, benches, mine } = night;
  const over = series ? `${series.title}, night ${series.number} of ${series.total}` : night.title;
  const where = benches.length > 0 ? `, ${benchWords(benches.map(({ tag }) => tag))}` : '';
  return (
    <div>
      <Typography variant="small" component="div" sx={{ color: 'token.ink2' }}>
        {over}
      </Typography>
      <Typography variant="h2" sx={{ fontSize: '1.1875rem', lineHeight: '1.625rem' }}>
        {longDayText(clubDay(night.startsAt)).replace(/^(\w{3})\w*/, '$1')}
      </Typography>
      <Box sx={{ fontSize: '0.8125rem', color: 'token.ink2' }}>
        {formatSpan(night.startsAt, night.endsAt)}
        {where}
      </Box>
      <PlaceBar night={night} />
      <Box sx={{ mt: '4px', '&:empty': { display: 'none' } }}>
        <StandingLine night={night} />
      </Box>
      {mine?.state === 'waiting' && (
        <Box sx={{ typography: 'small', color: 'token.trace', fontWeight: 600 }}>
          You are {lineWords(mine.line ?? 1)}.
        </Box>
      )}
      {night.note && <Box sx={{ mt: '6px', typography: 'small' }}>{night.note}</Box>}
      {night.cancelledAt && (
        <Box sx={{ mt: '8px' }}>
          <Banner kind="failed" title="Cancelled.">
            {night.cancelledReason}
          </Banner>
        </Box>
      )}
      <NightActs night={night} onChange={onChange} />
    </div>
  );
}

function NightActs({ night, onChange }: { night: NightDetail; onChange: (nightId: string) => void }) {
  const me = useMe();
  const [error, setError] = useState<unknown>();
  const [isCancelling, setIsCancelling] = useState(false);
  const isOpen = !night.cancelledAt && new Date(night.endsAt) > new Date();
  return (
    <>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px', mt: '12px' }}>
        <ComingButton night={night} onError={setError} />
        {isOpen && me.hasRole('mentor') && (
          <>
            <Button onClick={() => onChange(night.id)}>Change</Button>
            <Button color="error" onClick={() => setIsCancelling(true)}>
              Cancel the night
            </Button>
          </>
        )}
      </Box>
      {error !== undefined && (
        <Box sx={{ mt: '10px' }}>
          <ProblemAlert error={error} title="Your answer was not taken." />
        </Box>
      )}
      <CancelDialog night={night} open={isCancelling} onClose={() => setIsCancelling(false)} />
    </>
  );
}
