import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { usePhone } from '../../../shared-ui/use-phone';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { BuildStage } from '../api/builds';
import { useStill } from '../logic/use-still';
import type { ReadingFormState } from '../logic/use-reading-form';
import { readingSentence } from '../logic/words';
import { BenchLink } from './bench-link';
import { CautionTicks, MildCautions } from './caution-ticks';
import { KeepButtons } from './keep-buttons';
import { LiveResult } from './live-result';
import { PinnedResult } from './pinned-result';
import { ReadingFields } from './reading-fields';
import { Tries } from './tries';
import { UncertaintyList } from './uncertainty-list';

interface ReadingCardProps {
  form: ReadingFormState;
  stage: BuildStage;
  testPoint?: string;
}

/** A measured check, open: what the instrument shows goes in, level and verdict come out while typing. */
export function ReadingCard({ form, stage, testPoint }: ReadingCardProps) {
  const isPhone = usePhone();
  const { live } = form;
  const reading = live.state === 'read' ? live.reading : undefined;
  const spoken = useStill(
    live.state === 'read' ? `${readingSentence(live.reading)}, ${live.verdict}` : '',
    700,
  );
  return (
    <Box
      component="form"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        form.keep();
      }}
    >
      {form.keptFrom && (
        <Typography variant="small" component="p" sx={{ m: 0, mb: '6px', color: 'token.copper' }}>
          {form.keptFrom}
        </Typography>
      )}
      <ReadingFields form={form} testPoint={testPoint} />
      {form.waitsFor && form.instrumentsProblem && (
        <Box sx={{ mt: '10px' }}>
          <ProblemAlert
            title="The instruments did not load"
            error={form.instrumentsProblem}
            onRetry={form.askForInstruments}
          />
        </Box>
      )}
      {isPhone && <MildCautions cautions={stage.cautions} />}
      <CautionTicks form={form} />
      {isPhone ? (
        <PinnedResult form={form} />
      ) : (
        <>
          <Box sx={{ borderTop: '1px solid', borderColor: 'token.rule', mt: '14px', pt: '12px' }}>
            <LiveResult form={form} />
          </Box>
          <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px', mt: '14px', alignItems: 'center' }}>
            <KeepButtons form={form} />
            <Typography
              variant="small"
              component="span"
              sx={{ ml: 'auto', textAlign: 'right', color: 'token.ink2' }}
            >
              {form.keptAt && `Draft kept ${form.keptAt}`}
            </Typography>
          </Box>
        </>
      )}
      {form.problem && (
        <Box sx={{ mt: '10px' }}>
          <ProblemAlert title="Not sent yet. Kept on this device." error={form.problem} onRetry={form.keep} />
        </Box>
      )}
      <BenchLink to={form.benchPath} />
      {reading && (
        <UncertaintyList
          components={reading.components}
          expandedUncertainty={reading.expandedUncertainty}
          unit={reading.uncertaintyUnit}
        />
      )}
      <Tries check={form.check} />
      <VisuallyHidden>
        <span role="status">{spoken}</span>
      </VisuallyHidden>
      <button type="submit" hidden />
    </Box>
  );
}
