import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useRef } from 'react';
import { createPortal } from 'react-dom';
import { VerdictChip } from '../../../shared-ui/states/verdict-chip';
import { useToastsAbove } from '../../../shared-ui/use-toasts-above';
import { useKeyboardUp } from '../logic/use-keyboard-up';
import type { ReadingFormState } from '../logic/use-reading-form';
import { readingWords } from '../logic/words';
import { KeepButtons } from './keep-buttons';
import { BigValue, LiveWindow, secondValues, shownLive, uncertaintyText } from './live-result';
import { BOTTOM_BAR } from '../../../shared-ui/bottom-bar-height';

/** The phone's result, within thumb's reach; one row of it while the keyboard is up. */
export function PinnedResult({ form }: { form: ReadingFormState }) {
  const hidden = useKeyboardUp();
  const isShort = hidden !== undefined;
  const bar = useRef<HTMLElement>(null);
  useToastsAbove(bar);
  return createPortal(
    <Box
      component="section"
      ref={bar}
      aria-label="Result"
      sx={{
        position: 'fixed',
        // With the keyboard up it stands over the frame's bottom bar, which then has no use.
        zIndex: isShort ? 1600 : 'appBar',
        bottom: isShort ? hidden : `calc(${BOTTOM_BAR}px + env(safe-area-inset-bottom))`,
        left: 0,
        right: 0,
        px: '16px',
        py: isShort ? '8px' : '12px',
        borderTop: '1.5px solid',
        borderColor: 'token.ink',
        backgroundColor: 'token.sheet',
      }}
    >
      {isShort ? <ShortForm form={form} /> : <LongForm form={form} />}
    </Box>,
    document.body,
  );
}

function LongForm({ form }: { form: ReadingFormState }) {
  const shown = shownLive(form);
  const colour = shown?.isStale ? 'token.ink3' : 'token.ink2';
  return (
    <>
      {shown ? (
        <>
          <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: '12px' }}>
            <div>
              <BigValue {...shown} />
              <Typography variant="small" component="p" sx={{ m: 0, color: colour }}>
                {uncertaintyText(shown.read)}
              </Typography>
            </div>
            <Box sx={{ textAlign: 'right', pt: '6px' }}>
              <VerdictChip verdict={shown.read.verdict} isStale={shown.isStale} />
              <Typography variant="small" component="p" sx={{ m: 0, mt: '4px', color: colour }}>
                {secondValues(shown.read)}
              </Typography>
            </Box>
          </Box>
          <Box sx={{ my: '8px' }}>
            <LiveWindow check={form.check} {...shown} />
          </Box>
          {shown.read.advice && (
            <Typography
              variant="small"
              component="p"
              sx={{ mt: 0, mb: '8px', color: shown.isStale ? colour : 'token.ink' }}
            >
              {shown.read.advice}
            </Typography>
          )}
        </>
      ) : (
        <Typography variant="small" component="p" sx={{ mt: 0, mb: '8px', color: 'token.ink3' }}>
          The level shows here as you type.
        </Typography>
      )}
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px' }}>
        <KeepButtons form={form} />
      </Box>
    </>
  );
}

function ShortForm({ form }: { form: ReadingFormState }) {
  const shown = shownLive(form);
  const words = shown && readingWords(shown.read.reading, 2);
  return (
    <Box sx={{ display: 'flex', alignItems: 'center', justifyContent: 'space-between', gap: '8px' }}>
      <Typography component="p" noWrap sx={{ m: 0, color: shown?.isStale ? 'token.ink3' : 'token.ink' }}>
        {words && (
          <>
            <Box component="b" sx={{ fontSize: '1.375rem' }}>
              {words.value}
            </Box>{' '}
            <Typography variant="small" component="span">
              {words.plusMinus} {words.unit}
            </Typography>
          </>
        )}
      </Typography>
      <Box sx={{ display: 'flex', alignItems: 'center', gap: '8px' }}>
        {shown && <VerdictChip verdict={shown.read.verdict} isStale={shown.isStale} narrow />}
        <KeepButtons form={form} isShort />
      </Box>
    </Box>
  );
}
