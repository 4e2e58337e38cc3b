import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useEffect } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { useMe } from '../../../api-client/session';
import { formatDay } from '../../../lib/club-time-text';
import { capital, counted } from '../../../lib/text';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { FormCheck } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import type { BuildNight } from '../api/nights';
import { useScheduleNights } from '../api/nights';
import { plannedEntries, type Entry } from '../night-view';
import { scheduleWords, tellWords, type Repeats } from '../night-words';
import { emptyPlan, formErrors, planOf, type PlanForm } from '../plan-form';
import { PlanFields } from './plan-fields';
import { PlannedDates } from './planned-dates';
import { usePlanPreview } from './use-plan-preview';

interface PlanDrawerProps {
  kind: 'series' | 'night';
  /** A day picked in the month. */
  day?: string;
  onClose: () => void;
  /** What is being planned, for the month to draw. */
  onPlanned: (entries: Entry[]) => void;
  onScheduled: (first: BuildNight) => void;
}

const FIRST_REPEATS: Record<PlanDrawerProps['kind'], Repeats> = { series: 'each week', night: 'once' };

/** Planning a series or a night, each date checked while it is typed. What is typed is kept on the device. */
export function PlanDrawer({ kind, day, onClose, onPlanned, onScheduled }: PlanDrawerProps) {
  const me = useMe();
  const say = useToast();
  const schedule = useScheduleNights();
  const form = useForm<PlanForm>({ defaultValues: emptyPlan(FIRST_REPEATS[kind], me.id) });
  const draft = useFormDraft(form, `build-nights:${kind}`);
  const preview = usePlanPreview(form.control);
  const title = useWatch({ control: form.control, name: 'title' });
  const repeats = useWatch({ control: form.control, name: 'repeats' });
  const { nights, toTell } = preview;

  useEffect(() => {
    if (day) form.setValue('first', day, { shouldDirty: true });
  }, [day, form]);
  useEffect(() => onPlanned(plannedEntries(nights, title)), [nights, title, onPlanned]);
  useEffect(() => () => onPlanned([]), [onPlanned]);

  const send = (withoutDates: readonly string[]) => {
    const values = form.getValues();
    const errors = Object.entries(formErrors(values)) as [keyof PlanForm, string][];
    form.clearErrors();
    errors.forEach(([name, message], index) =>
      form.setError(name, { message }, { shouldFocus: index === 0 }),
    );
    const plan = planOf({ ...values, skip: [...values.skip, ...withoutDates] });
    if (!plan) return;
    carryOut(schedule, plan, {
      onSuccess: ({ nights: made, told }) => {
        draft.drop();
        say(madeWords(made, told));
        onScheduled(made[0]);
      },
    });
  };

  return (
    <DockedDrawer
      open
      width={386}
      title={repeats === 'once' ? 'Schedule a night' : 'Plan a series'}
      onClose={onClose}
      footer={
        <>
          {schedule.isError && (
            <Box sx={{ mb: '10px' }}>
              <ProblemAlert error={schedule.error} title="Nothing was scheduled.">
                What you typed is still in the form.
              </ProblemAlert>
            </Box>
          )}
          <TellTick form={form} people={toTell} />
          <ScheduleButtons
            nights={nights}
            isReadable={preview.isReadable}
            isStale={preview.isStale}
            isBusy={schedule.isPending}
            onSend={send}
          />
        </>
      }
    >
      {draft.keptFrom && (
        <Box sx={{ mb: '6px', typography: 'small', color: 'token.ink2' }}>{draft.keptFrom}</Box>
      )}
      <PlanFields control={form.control} errors={preview.errors} />
      <PlannedDates form={form} preview={preview} />
    </DockedDrawer>
  );
}

function madeWords(made: readonly BuildNight[], told: number): string {
  const what =
    made.length === 1
      ? `${formatDay(made[0].startsAt)} is scheduled.`
      : `${capital(counted(made.length, 'night'))} scheduled.`;
  return told === 0
    ? what
    : `${what} ${capital(counted(told, 'person', 'people'))} ${told === 1 ? 'is' : 'are'} told by mail.`;
}

function TellTick({ form, people }: { form: ReturnType<typeof useForm<PlanForm>>; people: number }) {
  const stages = useWatch({ control: form.control, name: 'stageIds' });
  if (stages.length === 0) return null;
  return (
    <FormCheck
      control={form.control}
      name="tellByMail"
      label={tellWords(people)}
      unavailable={people === 0}
    />
  );
}

interface ScheduleButtonsProps {
  nights: ReturnType<typeof usePlanPreview>['nights'];
  isReadable: boolean;
  isStale: boolean;
  isBusy: boolean;
  onSend: (withoutDates: readonly string[]) => void;
}

/** The first button says what stands in the way, the second does what is possible. */
function ScheduleButtons({ nights, isReadable, isStale, isBusy, onSend }: ScheduleButtonsProps) {
  const wanted = nights.filter(({ verdict }) => verdict !== 'left out');
  const clashing = wanted.filter(({ verdict }) => verdict === 'clash').map(({ date }) => date);
  const possible = wanted.length - clashing.length;
  const all = scheduleWords(wanted.length, clashing.length);
  // Pressed all the same, it says at each field what cannot be read.
  if (!isReadable) {
    return (
      <WaitingButton fullWidth onPress={() => onSend([])}>
        Schedule, no date yet
      </WaitingButton>
    );
  }
  if (wanted.length === 0) return <WaitingButton fullWidth>Schedule, no date yet</WaitingButton>;
  if (clashing.length === 0) {
    return (
      <Button variant="contained" fullWidth loading={isBusy} disabled={isStale} onClick={() => onSend([])}>
        {all}
      </Button>
    );
  }
  return (
    <Box sx={{ display: 'flex', gap: '8px', '& > *': { flex: '1 1 auto', px: '10px' } }}>
      <WaitingButton reason="Settle each clash first, or leave those dates out.">{all}</WaitingButton>
      {possible > 0 && (
        <Button loading={isBusy} onClick={() => onSend(clashing)}>
          {scheduleWords(possible, 0)}
        </Button>
      )}
    </Box>
  );
}
