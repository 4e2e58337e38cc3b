import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { Link as RouterLink, useSearchParams } from 'react-router-dom';
import { formatDay, formatInClubZone } from '../../../lib/club-time-text';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useLetterKeys } from '../../../shared-ui/use-letter-keys';
import { useBuild } from '../api/builds';
import { useReviews, type Review } from '../api/reviews';
import { Decision } from '../components/decision';
import { Evidence } from '../components/evidence';
import { ReviewQueue } from '../components/review-queue';
import { Worksheets } from '../components/worksheets';
import { findStage } from '../logic/stage';
import { queueText } from '../logic/waiting';
import { serialText } from '../logic/words';

/** On a wide screen three panels from edge to edge, as deep as the window; below that one after the other. */
const PANELS = {
  display: 'grid',
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: '252px minmax(0, 1fr) 290px' },
  gap: { xs: '24px', lg: 0 },
  m: { lg: '-24px -32px -40px -34px' },
  minHeight: { lg: '100dvh' },
} as const;

const QUEUE = {
  pt: { lg: '24px' },
  borderRight: { lg: '1px solid' },
  borderColor: { lg: 'token.rule' },
} as const;

const DECISION = {
  display: 'flex',
  flexDirection: 'column',
  alignSelf: 'start',
  position: { lg: 'sticky' },
  top: 0,
  height: { lg: '100dvh' },
  overflowY: 'auto',
  p: '20px 20px 0',
  backgroundColor: 'token.sheet',
  border: { xs: '1px solid', lg: 0 },
  borderLeft: { lg: '1.5px solid' },
  borderColor: { xs: 'token.rule', lg: 'token.ink' },
  borderRadius: { xs: '3px', lg: 0 },
} as const;

const keyOf = ({ buildId, stageId }: Review): string => `${buildId}:${stageId}`;

/** Which stage is waiting on me, and does it hold up? Queue, evidence, decision. */
export default function ReviewPage() {
  const reviews = useReviews();
  const [now] = useState(() => new Date());
  const title = (
    <PageTitle tab="Review queue">
      <b>Review</b> queue
    </PageTitle>
  );
  if (reviews.isPending || reviews.isError)
    return (
      <>
        {title}
        {reviews.isPending ? (
          <LoadingBars rows={6} label="Opening the queue" />
        ) : (
          <ProblemAlert error={reviews.error} onRetry={() => void reviews.refetch()} />
        )}
      </>
    );
  const { items, lastSignOffAt } = reviews.data;
  if (items.length === 0)
    return (
      <>
        {title}
        <EmptyState title="Nothing waiting.">
          {lastSignOffAt ? `Last sign-off ${formatDay(lastSignOffAt)}.` : 'Nothing has been signed off yet.'}
        </EmptyState>
      </>
    );
  return <Queue reviews={items} now={now} />;
}

function Queue({ reviews, now }: { reviews: readonly Review[]; now: Date }) {
  const [query, setQuery] = useSearchParams();
  const asked = reviews.findIndex((review) => keyOf(review) === query.get('stage'));
  const openIndex = Math.max(0, asked);
  const open = reviews[openIndex];
  const go = (index: number) => {
    const next = reviews[Math.min(Math.max(index, 0), reviews.length - 1)];
    if (next) setQuery({ stage: keyOf(next) }, { replace: true, preventScrollReset: true });
  };
  useLetterKeys({ j: () => go(openIndex + 1), k: () => go(openIndex - 1) });
  return (
    <Box sx={PANELS}>
      <Box component="section" aria-label="Queue" sx={QUEUE}>
        <Box sx={{ pl: { lg: '30px' } }}>
          <PageTitle tab="Review queue">
            <b>Review</b> queue
          </PageTitle>
          <Typography variant="small" component="p" sx={{ mt: '-12px', mb: '12px', color: 'token.ink2' }}>
            {queueText(
              reviews.map(({ sentAt }) => sentAt),
              now,
            )}
          </Typography>
        </Box>
        <ReviewQueue reviews={reviews} openIndex={openIndex} now={now} onOpen={go} />
        <Typography
          variant="small"
          component="p"
          sx={{
            m: 0,
            p: { lg: '16px 16px 0 30px' },
            color: 'token.ink2',
            display: { xs: 'none', md: 'block' },
          }}
        >
          <b>J</b> and <b>K</b> move through the queue. <b>S</b> signs off, <b>B</b> sends back.
        </Typography>
      </Box>
      {open && (
        <OpenReview key={keyOf(open)} review={open} onDecided={() => setQuery({}, { replace: true })} />
      )}
    </Box>
  );
}

function OpenReview({ review, onDecided }: { review: Review; onDecided: () => void }) {
  const { buildId, stageId, builder, stagePosition, stageName, planName, serial, sentAt, note, isOwn } =
    review;
  const build = useBuild(buildId);
  if (build.isPending) return <LoadingBars rows={8} label="Opening the stage" />;
  if (build.isError) return <ProblemAlert error={build.error} onRetry={() => void build.refetch()} />;
  const stage = findStage(build.data, stageId);
  if (!stage) return null;
  return (
    <>
      <Box component="section" aria-label="Evidence" sx={{ minWidth: 0, p: { lg: '24px 28px 40px' } }}>
        <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
          {planName}, {serialText(serial)}. Sent {formatInClubZone(sentAt)}
        </Typography>
        <Typography variant="h1" component="h2" sx={{ mb: '8px' }}>
          {builder.name},{' '}
          <Link
            component={RouterLink}
            to={`/build/${buildId}/stages/${stageId}`}
            color="inherit"
            sx={{ textDecoration: 'none', borderBottom: 0 }}
          >
            <b>
              stage {stagePosition} {stageName}
            </b>
          </Link>
        </Typography>
        {note && (
          <Box
            component="blockquote"
            sx={{ m: '0 0 16px', pl: '14px', borderLeft: '3px solid', borderColor: 'token.ink3' }}
          >
            “{note}”
          </Box>
        )}
        <Evidence stage={stage} />
        <Worksheets buildId={buildId} stageId={stageId} isOwn={false} />
      </Box>
      <Box component="section" aria-labelledby="decision" sx={DECISION}>
        <Typography variant="h2" id="decision" sx={{ fontSize: '1.25rem', mb: '12px' }}>
          Your decision
        </Typography>
        <Decision build={build.data} stage={stage} isOwn={isOwn} onDecided={onDecided} />
      </Box>
    </>
  );
}
