import Box from '@mui/material/Box';
import { CautionBox } from '../../../shared-ui/caution-box';
import { CheckField } from '../../../shared-ui/fields/check-field';
import type { Caution } from '../api/builds';
import { cautionsOf, gravesOf, mildOf, type CautionWords } from '../logic/cautions';
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

type Cautions = { cautions: readonly Caution[] };

/** The milder ones, which only have to be read. */
export const MildCautions = ({ cautions }: Cautions) => <ToRead words={mildOf(cautions)} />;

/** The grave ones where nothing is typed, so that there is no tick to ask for. */
export const GraveCautions = ({ cautions }: Cautions) => <ToRead words={gravesOf(cautions)} />;

export const AllCautions = ({ cautions }: Cautions) => <ToRead words={cautionsOf(cautions)} />;

function ToRead({ words }: { words: readonly CautionWords[] }) {
  if (words.length === 0) return null;
  return (
    <Box sx={{ display: 'grid', gap: '8px', my: '12px' }}>
      {words.map(({ kind, text }) => (
        <CautionBox key={kind} kind={kind}>
          {text}
        </CautionBox>
      ))}
    </Box>
  );
}
