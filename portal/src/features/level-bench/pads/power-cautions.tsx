import Box from '@mui/material/Box';
import { CautionBox } from '../../../shared-ui/caution-box';
import type { WorkedPad } from './figures';
import { RF_CAUTION_WATTS, wattText } from './words';

/** Beside the power, from 1 W on. */
export function PowerCautions({ worked }: { worked: WorkedPad }) {
  const { inputWatts, shares } = worked;
  if (inputWatts < RF_CAUTION_WATTS) return null;
  const heat = inputWatts * (1 - shares.load - shares.back);
  return (
    <Box sx={{ display: 'grid', gap: '8px', mb: '18px' }}>
      <CautionBox kind="RF power">
        Have the pad and its load connected and closed in before power is put on; hands off until it is off.
        Local rules and your licence decide what may go on the air.
      </CautionBox>
      <CautionBox kind="hot parts">
        The pad turns {wattText(heat)} into heat. A resistor at half its rating burns fingers, and stays hot
        for minutes.
      </CautionBox>
    </Box>
  );
}
