import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { createContext, useContext, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { Link } from 'react-router-dom';
import { Icon } from './icon';

const Slot = createContext<HTMLElement | null>(null);

/** The frame's header on a phone, into which a page may put its own bar. */
export const PhoneBarSlot = Slot.Provider;

interface PhoneBarProps {
  title: string;
  subtitle?: string;
  /** Where the arrow leads; none on a page of the bottom bar. */
  backTo?: string;
  backLabel?: string;
  /** At the right: a state, a unit. */
  end?: ReactNode;
}

/** On a phone, takes the place of the product's name at the top of an inner page; nothing on wider screens. */
export function PhoneBar({ title, subtitle, backTo, backLabel, end }: PhoneBarProps) {
  const slot = useContext(Slot);
  if (!slot) return null;
  return createPortal(
    <Box
      sx={{
        display: { xs: 'flex', md: 'none' },
        alignItems: 'center',
        gap: '8px',
        width: '100%',
        minWidth: 0,
      }}
    >
      {backTo && (
        <Box
          component={Link}
          to={backTo}
          aria-label={backLabel}
          sx={{
            display: 'grid',
            placeItems: 'center',
            width: 44,
            height: 44,
            ml: '-8px',
            color: 'token.ink',
          }}
        >
          <Icon name="back" />
        </Box>
      )}
      <Box sx={{ flex: 1, minWidth: 0 }}>
        <Typography
          noWrap
          sx={{
            fontSize: subtitle ? '0.96875rem' : '1.0625rem',
            fontWeight: 700,
            lineHeight: subtitle ? '18px' : '24px',
          }}
        >
          {title}
        </Typography>
        {subtitle && (
          <Typography
            variant="least"
            component="p"
            noWrap
            sx={{ m: 0, fontWeight: 400, color: 'token.ink2' }}
          >
            {subtitle}
          </Typography>
        )}
      </Box>
      {end}
    </Box>,
    slot,
  );
}
