import Box from '@mui/material/Box';
import { CautionBox } from '../../../shared-ui/caution-box';
import { CheckField } from '../../../shared-ui/fields/check-field';
import type { Caution } from '../api/builds';
import { mildOf } from '../logic/cautions';
import type { ReadingFormState } from '../logic/use-reading-form';

/** The grave cautions of a stage, each with the tick it asks for before the reading is kept. */
export function CautionTicks({ form }: { form: ReadingFormState }) {
  if (form.graves.length === 0) return null;
  return (
    <Box sx={{ display: 'grid', gap: '8px', mt: '12px' }}>
      {form.graves.map(({ kind, text, tick }) => (
        <CautionBox
          key={kind}
          kind={kind}
          tick={
            <CheckField
              label={tick}
              checked={form.ticks.includes(kind)}
              onChange={(isOn) => form.setTick(kind, isOn)}
            />
          }
        >
          {text}
        </CautionBox>
      ))}
    </Box>
  );
}

/** The milder ones, which only have to be read. */
export function MildCautions({ cautions }: { cautions: readonly Caution[] }) {
  const mild = mildOf(cautions);
  if (mild.length === 0) return null;
  return (
    <Box sx={{ display: 'grid', gap: '8px', mt: '12px' }}>
      {mild.map(({ kind, text }) => (
        <CautionBox key={kind} kind={kind}>
          {text}
        </CautionBox>
      ))}
    </Box>
  );
}
