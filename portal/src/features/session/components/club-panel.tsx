import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { LevelPicture } from '../../../shared-ui/level-diagram/level-picture';
import { Mark } from '../../../shared-ui/mark';
import { token } from '../../../shared-ui/tokens';
import { SAMPLE_CHAIN } from './sample-chain';

const SQUARES = `linear-gradient(${token('rule')} 1px, transparent 1px), linear-gradient(90deg, ${token('rule')} 1px, transparent 1px)`;

/** The club's side of the sign-in page: squared paper, its name, and the way from the first stage to the load. */
export function ClubPanel({ clubName }: { clubName: string }) {
  return (
    <Box
      component="aside"
      aria-label="The club"
      sx={{
        position: 'relative',
        display: 'flex',
        flexDirection: 'column',
        flex: { md: '0 1 880px' },
        minWidth: 0,
        p: { xs: '20px 16px', md: '44px 60px 28px 60px' },
        borderRight: { md: `1.5px solid ${token('ink')}` },
        borderBottom: { xs: `1.5px solid ${token('ink')}`, md: 0 },
        backgroundColor: 'token.sunk',
        '&::before': {
          content: '""',
          position: 'absolute',
          inset: 0,
          opacity: 0.5,
          backgroundImage: SQUARES,
          backgroundSize: '22px 22px',
        },
        '& > *': { position: 'relative' },
      }}
    >
      <Box sx={{ display: 'flex', alignItems: 'center', gap: '16px', mb: { xs: '16px', md: '44px' } }}>
        <Mark width={60} />
        <Typography sx={{ fontSize: '1.375rem', lineHeight: 1.3, fontWeight: 700 }}>Ferrite Row</Typography>
      </Box>
      <Typography
        component="p"
        sx={{
          m: 0,
          fontSize: { xs: '1.75rem', md: 'min(2.875rem, 4.2vw)' },
          lineHeight: 1.22,
          fontWeight: 300,
          letterSpacing: '-0.025em',
        }}
      >
        {clubName && `${clubName}, `}
        <Box component="b" sx={{ display: { md: 'block' } }}>
          stage by stage to five watts
        </Box>
      </Typography>
      <Box sx={{ display: { xs: 'none', md: 'block' }, mt: '26px', mb: 'auto' }}>
        <LevelPicture points={SAMPLE_CHAIN} />
      </Box>
      <Typography
        variant="small"
        component="p"
        sx={{ display: { xs: 'none', md: 'block' }, m: 0, color: 'token.ink2' }}
      >
        The sample plan’s levels: from −18 dBm at the balanced modulator to +37 dBm, five watts, into the
        load.
      </Typography>
    </Box>
  );
}
