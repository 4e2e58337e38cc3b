import { formatQuantity } from '@ferrite-row/levels';
import Button from '@mui/material/Button';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import type { ReadingFormState } from '../logic/use-reading-form';

/** What the form can do now: keep the reading, or, when it is too close, take it again on a better scale. */
export function KeepButtons({ form, isShort = false }: { form: ReadingFormState; isShort?: boolean }) {
  const { live } = form;
  if (!form.isTicked)
    return (
      <WaitingButton reason="Tick the caution above first." fullWidth={isShort}>
        Keep, tick the caution first
      </WaitingButton>
    );
  if (form.waitsFor)
    return (
      <WaitingButton reason={form.waitsFor.reason} fullWidth={isShort}>
        Keep, {form.waitsFor.short}
      </WaitingButton>
    );
  const tighter = live.state === 'read' && live.verdict === 'too close to call' ? live.tighter : undefined;
  const keep = (
    <Button
      variant={tighter ? 'outlined' : 'contained'}
      onClick={form.keep}
      loading={form.isKeeping}
      sx={{ flex: isShort ? 'none' : { xs: 1, md: 'none' } }}
    >
      {isShort ? 'Keep' : tighter ? 'Keep as it is' : 'Keep this reading'}
    </Button>
  );
  if (!tighter || isShort) return keep;
  const setting = formatQuantity(tighter.voltsPerDivision, 'V/div');
  const typed = setting.replace('/div', '').replace(' ', '').replace('V', '');
  return (
    <>
      <Button variant="contained" onClick={() => form.takeAgainAt(typed)}>
        Take it again at {setting}
      </Button>
      {keep}
    </>
  );
}
