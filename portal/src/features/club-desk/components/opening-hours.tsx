import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useForm, useWatch, type Control } from 'react-hook-form';
import { carryOut } from '../../../api-client/carry-out';
import { useClub } from '../../../api-client/club';
import type { OpenDay } from '../../../lib/opening-hours';
import { FormText } from '../../../shared-ui/form/form-fields';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useToast } from '../../../shared-ui/toasts';
import { useFormDraft } from '../../../shared-ui/use-form-draft';
import { useSetOpeningHours } from '../api/rules';
import { fromProblem, toProblem, valuesOf, weekOf, WEEKDAYS, type HoursValues } from '../hours-form';

/** When somebody opens the workshop, day by day; the bench book hatches the rest. */
export function OpeningHours() {
  const club = useClub();
  return club.data ? <HoursForm week={club.data.openingHours} /> : null;
}

function HoursForm({ week }: { week: readonly OpenDay[] }) {
  const form = useForm<HoursValues>({ defaultValues: valuesOf(week), mode: 'onTouched' });
  const draft = useFormDraft(form, 'opening-hours');
  const setting = useSetOpeningHours();
  const say = useToast();
  const submit = form.handleSubmit((values) =>
    carryOut(setting, weekOf(values), {
      onSuccess: () => {
        draft.drop();
        form.reset(values);
        say('Opening hours saved.');
      },
    }),
  );
  return (
    <Box component="section" aria-label="Opening hours" sx={{ maxWidth: 640, mt: '28px' }}>
      <SectionHeading>Opening hours</SectionHeading>
      <Typography variant="small" component="p" sx={{ m: '8px 0 0', color: 'token.ink2' }}>
        By the clock on the club’s wall. Leave a day empty when the workshop is closed. The bench book hatches
        closed hours; they can still be booked by those who agree who opens. With no hours at all, nothing is
        hatched.
      </Typography>
      <Box
        component="form"
        aria-label="Opening hours"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          void submit();
        }}
        sx={{ display: 'grid', gap: '12px', mt: '12px' }}
      >
        {draft.keptFrom && (
          <Typography variant="small" role="status">
            {draft.keptFrom}
          </Typography>
        )}
        {WEEKDAYS.map((name, index) => (
          <Day key={name} name={name} index={index} control={form.control} />
        ))}
        {setting.isError && <ProblemAlert error={setting.error} title="The hours were not saved." />}
        <Button type="submit" variant="contained" loading={setting.isPending} sx={{ justifySelf: 'start' }}>
          Save the hours
        </Button>
      </Box>
    </Box>
  );
}

interface DayProps {
  name: string;
  index: number;
  control: Control<HoursValues>;
}

function Day({ name, index, control }: DayProps) {
  const day = useWatch({ control, name: `days.${index}` });
  const isClosed = day.from.trim() === '' && day.to.trim() === '';
  const time = { control, inputMode: 'numeric' as const };
  const at = (all: HoursValues) => all.days[index] ?? { from: '', to: '' };
  return (
    <Box
      role="group"
      aria-label={name}
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr 1fr', md: '110px 150px 150px 1fr' },
        gap: '4px 12px',
        alignItems: 'start',
      }}
    >
      <Box sx={{ gridColumn: { xs: '1 / -1', md: 'auto' }, fontWeight: 700, pt: { md: '34px' } }}>{name}</Box>
      <FormText
        {...time}
        name={`days.${index}.from`}
        label="From"
        rules={{
          deps: [`days.${index}.to`],
          validate: (_text: string, all: HoursValues) => fromProblem(at(all)) ?? true,
        }}
      />
      <FormText
        {...time}
        name={`days.${index}.to`}
        label="To"
        rules={{
          deps: [`days.${index}.from`],
          validate: (_text: string, all: HoursValues) => toProblem(at(all)) ?? true,
        }}
      />
      <Box sx={{ color: 'token.ink2', pt: { md: '34px' } }}>{isClosed && 'Closed'}</Box>
    </Box>
  );
}
