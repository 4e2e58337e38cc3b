import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import ButtonBase from '@mui/material/ButtonBase';
import Popover from '@mui/material/Popover';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { useMe } from '../../api-client/session';
import { PersonMark } from '../../shared-ui/person-mark';
import { ThemeChoice } from '../../shared-ui/theme-choice';
import { roleWords } from '../pages';
import { SignOutButton } from './sign-out-button';

/** Who is signed in, at the foot of the rail; opens their page, the theme, the list of keys and sign-out. */
export function PersonBlock({ onKeys }: { onKeys: () => void }) {
  const me = useMe();
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  const close = () => setAnchor(null);
  return (
    <Box sx={{ flex: 'none', borderTop: '1px solid', borderColor: 'token.rule' }}>
      <ButtonBase
        aria-haspopup="dialog"
        aria-expanded={anchor !== null}
        onClick={(event) => setAnchor(event.currentTarget)}
        sx={{ width: '100%', justifyContent: 'flex-start', gap: '10px', p: '12px 20px', textAlign: 'left' }}
      >
        <PersonMark name={me.name} size={32} />
        <span>
          <Typography variant="h3" component="span" sx={{ display: 'block' }}>
            {me.name}
          </Typography>
          <Typography
            variant="least"
            component="span"
            sx={{ display: 'block', fontWeight: 400, color: 'token.ink2' }}
          >
            {roleWords(me.roles)}
          </Typography>
        </span>
      </ButtonBase>
      <Popover
        open={anchor !== null}
        anchorEl={anchor}
        onClose={close}
        anchorOrigin={{ vertical: 'top', horizontal: 'left' }}
        transformOrigin={{ vertical: 'bottom', horizontal: -12 }}
        slotProps={{ paper: { role: 'dialog', 'aria-label': 'You and this device' } }}
      >
        <Box sx={{ display: 'grid', gap: '8px', width: 320, p: '16px' }}>
          <Typography variant="label">This device</Typography>
          <ThemeChoice />
          <Button component={Link} to="/you" onClick={close}>
            You
          </Button>
          <Button
            onClick={() => {
              close();
              onKeys();
            }}
          >
            Keys
          </Button>
          <SignOutButton />
        </Box>
      </Popover>
    </Box>
  );
}
