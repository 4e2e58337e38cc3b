import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { StateLine } from '../../../shared-ui/states/state-line';
import type { Review } from '../api/reviews';
import { waitedText } from '../logic/waiting';

interface ReviewQueueProps {
  reviews: readonly Review[];
  openIndex: number;
  now: Date;
  onOpen: (index: number) => void;
}

/** Who waits, the longest first. */
export function ReviewQueue({ reviews, openIndex, now, onOpen }: ReviewQueueProps) {
  return (
    <Box
      component="ul"
      aria-label="Waiting for a mentor"
      sx={{ m: 0, p: 0, listStyle: 'none', borderTop: '1.5px solid', borderColor: 'token.ink' }}
    >
      {reviews.map((review, index) => (
        <Box
          component="li"
          key={`${review.buildId}:${review.stageId}`}
          sx={{ borderBottom: '1px solid', borderColor: 'token.rule' }}
        >
          <Item review={review} now={now} isOpen={index === openIndex} onOpen={() => onOpen(index)} />
        </Box>
      ))}
    </Box>
  );
}

interface ItemProps {
  review: Review;
  now: Date;
  isOpen: boolean;
  onOpen: () => void;
}

function Item({ review, now, isOpen, onOpen }: ItemProps) {
  const { builder, stagePosition, stageName, sentAt, timesSentBack, cautions, isOwn } = review;
  return (
    <Box
      component="button"
      type="button"
      onClick={onOpen}
      aria-current={isOpen || undefined}
      sx={{
        display: 'block',
        width: '100%',
        p: '12px 16px 12px 26px',
        border: 0,
        borderLeft: '4px solid',
        borderColor: isOpen ? 'token.green' : 'transparent',
        backgroundColor: isOpen ? 'token.sheet' : 'transparent',
        color: 'token.ink',
        font: 'inherit',
        textAlign: 'left',
        cursor: 'pointer',
      }}
    >
      <Box component="span" sx={{ display: 'flex', justifyContent: 'space-between', gap: '8px' }}>
        <b>{builder.name}</b>
        <Typography variant="small" component="span" sx={{ color: 'token.ink2', whiteSpace: 'nowrap' }}>
          {waitedText(sentAt, now)}
        </Typography>
      </Box>
      <Typography variant="small" component="span" sx={{ display: 'block' }}>
        {stagePosition} {stageName}
      </Typography>
      {isOwn && (
        <StateLine shape="padlock" colour="ink3">
          Yours, for another mentor
        </StateLine>
      )}
      {timesSentBack > 0 && (
        <StateLine shape="back" colour="copper">
          {timesSentBack === 1 ? 'Sent back once, returned' : `Sent back ${timesSentBack} times, returned`}
        </StateLine>
      )}
      {cautions.includes('rf power') && (
        <StateLine shape="octagon" colour="oxide">
          RF power stage
        </StateLine>
      )}
    </Box>
  );
}
