import Box from '@mui/material/Box';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { PadDrawing } from '../drawings/pad-drawing';
import type { WorkedPad } from './figures';
import { endText, kindText, ohmText, partsText, whereText } from './words';

const USUAL_WIDTH = 806;

/** Narrower, the ends' words stand over the drawing and not beside it. */
const WIDE = 520;

function End({
  name,
  ohms,
  level,
  align,
}: {
  name: string;
  ohms: number;
  level?: string;
  align: 'left' | 'right';
}) {
  return (
    <Box sx={{ textAlign: align, typography: 'small', color: 'token.ink2' }}>
      <Box component="b" sx={{ color: 'token.ink' }}>
        {name}
      </Box>{' '}
      {ohmText(ohms)}
      {level && (
        <Box
          component="span"
          sx={{ display: 'block', fontSize: '0.9375rem', fontWeight: 700, color: 'token.ink' }}
        >
          {level}
        </Box>
      )}
    </Box>
  );
}

/** The pad with the values to fit, and the levels at its two ends. */
export function PadPicture({ worked }: { worked: WorkedPad }) {
  const [frame, width] = useWidth<HTMLDivElement>(USUAL_WIDTH);
  const { rows, asked, design } = worked;
  const words = rows.map((row) => `${row.name} ${whereText(row)} ${partsText(row)}`).join(', ');
  return (
    <Box
      sx={{
        border: '1px solid',
        borderColor: 'token.rule',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        p: '12px 16px',
        mt: '10px',
      }}
    >
      <Box
        sx={{
          display: 'flex',
          justifyContent: 'space-between',
          gap: '12px',
          mb: width < WIDE ? '4px' : '-38px',
        }}
      >
        <End name="From" ohms={asked.sourceOhms} level={endText(worked, 'in')} align="left" />
        <End name="To" ohms={asked.loadOhms} level={endText(worked, 'out')} align="right" />
      </Box>
      <div ref={frame}>
        <PadDrawing
          resistors={rows.map((row) => ({
            name: row.name,
            from: row.from,
            to: row.to,
            value: ohmText(row.ohms),
            arrangement: row.fitted.arrangement,
          }))}
          width={width}
          size="large"
          words={`${kindText(design)}: ${words}`}
        />
      </div>
    </Box>
  );
}
