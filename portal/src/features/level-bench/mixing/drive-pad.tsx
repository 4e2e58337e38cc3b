import type { PadDesign } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import { PadDrawing } from '../drawings/pad-drawing';
import { exactText, ohmsText, padText } from './answer-words';

/** The pi pad that sets the drive right, with its nearest values, and the exact ones under it. */
export function DrivePad({ pad }: { pad: PadDesign }) {
  return (
    <Box component="figure" sx={{ m: 0, flex: 'none', width: 204, textAlign: 'center' }}>
      <PadDrawing
        resistors={pad.resistors.map(({ name, from, to, ohms }) => ({
          name,
          from,
          to,
          value: ohmsText(ohms),
        }))}
        width={204}
        size="small"
        words={`Pi pad: ${padText(pad)}, to ground, in the line and to ground.`}
      />
      <Box component="figcaption" sx={{ typography: 'small', color: 'token.ink2' }}>
        ohm; exact {exactText(pad)}
      </Box>
    </Box>
  );
}
