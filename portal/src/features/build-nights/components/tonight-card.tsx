import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { clubDay } from '../../../lib/club-time';
import { formatSpan, longDayText } from '../../../lib/club-time-text';
import { listText } from '../../../lib/text';
import type { BuildNight } from '../api/nights';
import { benchWords } from '../night-words';
import { ComingButton } from './coming-button';
import { PlaceBar } from './place-bar';
import { StandingLine } from './standing-line';

interface TonightCardProps {
  night: BuildNight;
  onOpen: (nightId: string) => void;
  onError: (error: unknown) => void;
}

/** The evening that is on today, before all the others. */
export function TonightCard({ night, onOpen, onError }: TonightCardProps) {
  const { series, benches, mentors } = night;
  const over = series ? `Tonight, night ${series.number} of ${series.total}` : `Tonight, ${night.title}`;
  const where = benches.length > 0 ? `, ${benchWords(benches.map(({ tag }) => tag))}` : '';
  return (
    <Box
      component="section"
      aria-label="Tonight"
      sx={{
        mb: '18px',
        p: '14px 16px',
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
      }}
    >
      <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: '8px' }}>
        <Typography variant="small" sx={{ color: 'token.ink2' }}>
          {over}
        </Typography>
        <StandingLine night={night} />
      </Box>
      <Typography variant="h2" sx={{ fontSize: '1.25rem', lineHeight: '1.75rem' }}>
        {longDayText(clubDay(night.startsAt))}
      </Typography>
      <Box sx={{ fontSize: '0.8125rem', color: 'token.ink2' }}>
        {formatSpan(night.startsAt, night.endsAt)}
        {where}
      </Box>
      <PlaceBar night={night}>, {listText(mentors.map(({ name }) => name.split(' ')[0]))} mentoring</PlaceBar>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px', mt: '12px' }}>
        {night.mine === null && <ComingButton night={night} onError={onError} />}
        <Button onClick={() => onOpen(night.id)}>Who is coming</Button>
      </Box>
    </Box>
  );
}
