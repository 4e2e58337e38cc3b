import Box from '@mui/material/Box';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { token } from '../../../shared-ui/tokens';
import type { WorkedPad } from './figures';
import { wattText } from './words';

interface Share {
  name: string;
  share: number;
  ground: string;
}

/** Less than this is not worth a place of its own. */
const LEAST = 0.001;

const percent = (share: number): string => `${(100 * share).toFixed(share < 0.0995 ? 1 : 0)} %`;

const HATCH = `repeating-linear-gradient(45deg, ${token('brassFill')} 0 1.5px, transparent 1.5px 7px)`;

function sharesOf({ rows, shares, design }: WorkedPad): Share[] {
  const resistors = rows.map(({ name }, index) => ({
    name,
    share: design.fitted.dissipationShares[index] ?? 0,
    ground: HATCH,
  }));
  return [
    ...resistors,
    { name: 'Load', share: shares.load, ground: token('greenTint') },
    { name: 'Back', share: shares.back, ground: token('sunk') },
  ].filter(({ share }) => share >= LEAST);
}

/** Where the power goes, as one bar: heat hatched, the load's green. */
export function PowerStrip({ worked }: { worked: WorkedPad }) {
  const shares = sharesOf(worked);
  return (
    <Box component="section" aria-label="Where the power goes" sx={{ mt: '18px' }}>
      <SectionHeading end={`${wattText(worked.inputWatts)} from the source`}>
        Where the power goes
      </SectionHeading>
      <Box
        aria-hidden
        sx={{ display: 'flex', height: 22, mt: '10px', border: '1px solid', borderColor: 'token.edge' }}
      >
        {shares.map(({ name, share, ground }) => (
          <Box
            key={name}
            sx={{ flex: `${share} 0 0`, background: ground, boxShadow: `inset -1px 0 ${token('edge')}` }}
          />
        ))}
      </Box>
      <Box
        component="ul"
        sx={{
          display: 'flex',
          flexWrap: 'wrap',
          gap: '2px 20px',
          m: '6px 0 0',
          p: 0,
          listStyle: 'none',
          typography: 'small',
          color: 'token.ink2',
        }}
      >
        {shares.map(({ name, share }) => (
          <li key={name}>
            {name} <b>{percent(share)}</b>
            {worked.inputWatts > 0 && `, ${wattText(share * worked.inputWatts)}`}
          </li>
        ))}
      </Box>
    </Box>
  );
}
