import Box from '@mui/material/Box';
import { clubDay } from '../../../lib/club-time';
import { dayText, formatSpan } from '../../../lib/club-time-text';
import type { BuildNight } from '../api/nights';
import { nightName } from '../night-view';
import { lineWords, placesWords } from '../night-words';
import { ComingButton } from './coming-button';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { StandingLine } from './standing-line';

interface NightRowProps {
  night: BuildNight;
  main: BuildNight['series'];
  isOpen: boolean;
  onOpen: (nightId: string) => void;
  onError: (error: unknown) => void;
}

/** One night in the list: its day, what and when, and how the person stands to it. */
export function NightRow({ night, main, isOpen, onOpen, onError }: NightRowProps) {
  const [weekday, number] = dayText(clubDay(night.startsAt)).split(' ');
  return (
    <Box
      component="li"
      sx={{
        display: 'grid',
        gridTemplateColumns: '46px minmax(0, 1fr) auto',
        alignItems: 'center',
        gap: '8px 12px',
        minHeight: 76,
        p: '9px 0',
        borderBottom: '1px solid',
        borderColor: 'token.rule',
        ...(isOpen && {
          px: '10px',
          mx: '-10px',
          backgroundColor: 'token.sheet',
          outline: '1.5px solid',
          outlineColor: 'token.ink',
        }),
      }}
    >
      <Box
        aria-hidden
        sx={{ textAlign: 'center', fontSize: '0.75rem', lineHeight: '1rem', color: 'token.ink2' }}
      >
        {weekday}
        <Box sx={{ fontSize: '1.25rem', lineHeight: '1.625rem', fontWeight: 300, color: 'token.ink' }}>
          {number}
        </Box>
      </Box>
      <Box
        component="button"
        type="button"
        aria-expanded={isOpen}
        onClick={() => onOpen(night.id)}
        sx={{
          minHeight: 56,
          p: 0,
          border: 0,
          font: 'inherit',
          textAlign: 'left',
          color: 'inherit',
          background: 'none',
          cursor: 'pointer',
        }}
      >
        <VisuallyHidden>{dayText(clubDay(night.startsAt))}, </VisuallyHidden>
        <Box
          component="b"
          sx={{ display: 'block', textDecoration: night.cancelledAt ? 'line-through' : undefined }}
        >
          {nightName(night, main)}
        </Box>
        <Box
          component="span"
          sx={{ display: 'block', fontSize: '0.8125rem', fontWeight: 600, color: 'token.ink2' }}
        >
          {formatSpan(night.startsAt, night.endsAt)}
        </Box>
        <Box component="span" sx={{ display: 'block', typography: 'small', color: 'token.ink2' }}>
          {secondLine(night)}
        </Box>
      </Box>
      <RowEnd night={night} onError={onError} />
    </Box>
  );
}

function secondLine(night: BuildNight): string {
  const { mine, coming, places } = night;
  if (night.cancelledAt) return night.cancelledReason ?? '';
  if (mine?.state !== 'waiting') return placesWords(night);
  return `${coming} of ${places}, you are ${lineWords(mine.line ?? 1)}`;
}

function RowEnd({ night, onError }: Pick<NightRowProps, 'night' | 'onError'>) {
  if (night.mine || night.cancelledAt) return <StandingLine night={night} />;
  return <ComingButton night={night} short onError={onError} />;
}
