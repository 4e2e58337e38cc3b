import { decimalsFor, type UncertaintyComponent } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { capital, fixed } from '../../../lib/text';

interface UncertaintyListProps {
  components: readonly Pick<UncertaintyComponent, 'name' | 'limit' | 'standardUncertainty'>[];
  expandedUncertainty: number;
  unit: string;
}

/** Where the ± comes from: each part's limit and what it adds, then how they are put together. */
export function UncertaintyList({ components, expandedUncertainty, unit }: UncertaintyListProps) {
  const decimals = Math.min(decimalsFor(expandedUncertainty), 6);
  const total = fixed(expandedUncertainty, decimals);
  return (
    <Box component="details" sx={{ mt: '8px', fontSize: '0.78125rem' }}>
      <Box component="summary" sx={{ color: 'token.green', fontWeight: 600, cursor: 'pointer', py: '4px' }}>
        Where ± {total} comes from
      </Box>
      <Box component="table" sx={{ width: '100%', borderCollapse: 'collapse', '& td, & th': { py: '3px' } }}>
        <thead>
          <tr>
            <Box component="th" sx={{ textAlign: 'left', fontWeight: 600, color: 'token.ink3' }}>
              Part
            </Box>
            <Box component="th" sx={{ textAlign: 'right', fontWeight: 600, color: 'token.ink3' }}>
              Limit, {unit}
            </Box>
            <Box component="th" sx={{ textAlign: 'right', fontWeight: 600, color: 'token.ink3' }}>
              Standard, {unit}
            </Box>
          </tr>
        </thead>
        <tbody>
          {components.map(({ name, limit, standardUncertainty }) => (
            <tr key={name}>
              <td>{capital(name)}</td>
              <Box component="td" sx={{ textAlign: 'right' }}>
                ± {fixed(limit, decimals)}
              </Box>
              <Box component="td" sx={{ textAlign: 'right' }}>
                {fixed(standardUncertainty, decimals)}
              </Box>
            </tr>
          ))}
        </tbody>
      </Box>
      <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
        The squares of the standard parts added, the root taken, times two: ± {total} {unit}.
      </Typography>
    </Box>
  );
}
