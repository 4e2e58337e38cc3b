import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { ProblemError } from '../../../api-client/problem-error';
import { clubDay, wallOf } from '../../../lib/club-time';
import { clockText, formatDay } from '../../../lib/club-time-text';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import type { CheckedNight, NightChange, NightDetail } from '../api/nights';
import { nightQuery, useChangeNight } from '../api/nights';
import { FIELD_OF, formErrors, planOf, type PlanForm } from '../plan-form';
import { PlanFields } from './plan-fields';

interface ChangeDrawerProps {
  nightId: string;
  onClose: () => void;
}

/** Changing one night. Only what differs is sent, so that nobody else's change is written over. */
export function ChangeDrawer({ nightId, onClose }: ChangeDrawerProps) {
  const query = useQuery(nightQuery(nightId));
  if (query.data) return <ChangeForm key={nightId} night={query.data} onClose={onClose} />;
  return (
    <DockedDrawer open width={386} title="Change a night" onClose={onClose}>
      {query.isError ? (
        <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />
      ) : (
        <LoadingBars rows={6} label="Loading the night" />
      )}
    </DockedDrawer>
  );
}

function ChangeForm({ night, onClose }: { night: NightDetail; onClose: () => void }) {
  const say = useToast();
  const change = useChangeNight();
  const form = useForm<PlanForm>({ defaultValues: formOf(night) });
  const draft = useFormDraft(form, `build-night-change:${night.id}`);
  const send = () => {
    const errors = Object.entries(formErrors(form.getValues())) as [keyof PlanForm, string][];
    form.clearErrors();
    errors.forEach(([name, message]) => form.setError(name, { message }));
    const body = changeOf(night, form.getValues());
    if (!body) return;
    carryOut(
      change,
      { id: night.id, change: body },
      {
        onSuccess: (after) => {
          draft.drop();
          say(`${formatDay(after.startsAt)} is changed.`);
          onClose();
        },
      },
    );
  };
  return (
    <DockedDrawer
      open
      width={386}
      title={`Change ${formatDay(night.startsAt)}`}
      onClose={onClose}
      footer={
        <>
          {change.isError && (
            <Box sx={{ mb: '10px' }}>
              <ProblemAlert error={change.error} title="Nothing was changed.">
                {clashWords(change.error)}
              </ProblemAlert>
            </Box>
          )}
          <Button variant="contained" fullWidth loading={change.isPending} onClick={send}>
            Keep the change
          </Button>
        </>
      }
    >
      {draft.keptFrom && (
        <Box sx={{ mb: '6px', typography: 'small', color: 'token.ink2' }}>{draft.keptFrom}</Box>
      )}
      <PlanFields control={form.control} errors={refusedFields(change.error)} isOneNight />
      <Box sx={{ mt: '10px', typography: 'small', color: 'token.ink2' }}>
        Other times are told by mail to everybody who is coming or waiting. More places move the waiting list
        up.
      </Box>
    </DockedDrawer>
  );
}

function formOf(night: NightDetail): PlanForm {
  const ids = (items: readonly { id: string }[]) => items.map(({ id }) => id);
  return {
    title: night.title,
    repeats: 'once',
    first: clubDay(night.startsAt),
    nights: '1',
    from: clockText(wallOf(night.startsAt).minute),
    to: clockText(wallOf(night.endsAt).minute),
    places: String(night.places),
    benchIds: ids(night.benches),
    mentorIds: ids(night.mentors),
    stageIds: ids(night.stages),
    note: night.note,
    tellByMail: false,
    skip: [],
    instead: [],
  };
}

/** The fields that differ from the night as it is; undefined while one cannot be read. */
function changeOf(night: NightDetail, form: PlanForm): NightChange | undefined {
  const [before, after] = [planOf(formOf(night)), planOf(form)];
  if (!before || !after) return undefined;
  const names = [
    'title',
    'startsAt',
    'endsAt',
    'places',
    'benchIds',
    'mentorIds',
    'stageIds',
    'note',
  ] as const;
  const differing = names.filter((name) => JSON.stringify(before[name]) !== JSON.stringify(after[name]));
  return Object.fromEntries(differing.map((name) => [name, after[name]]));
}

function refusedFields(error: unknown): Partial<Record<keyof PlanForm, string>> {
  if (!(error instanceof ProblemError)) return {};
  return Object.fromEntries(
    error.errors.map(({ pointer, detail }) => [FIELD_OF[pointer] ?? 'title', detail]),
  );
}

function clashWords(error: unknown): string {
  if (!(error instanceof ProblemError) || !error.is('night-clash')) return '';
  const clashes = error.body.clashes as CheckedNight[];
  return clashes.flatMap((night) => night.clashes.map(({ detail }) => detail)).join(' ');
}
