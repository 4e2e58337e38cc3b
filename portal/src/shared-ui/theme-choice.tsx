import { useColorScheme } from '@mui/material/styles';
import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';

/** Light, dark, or as the device says; kept on this device, so a dim bench tablet can stay dark. */
export function ThemeChoice({ device = 'device' }: { device?: 'device' | 'phone' }) {
  const { mode, setMode } = useColorScheme();
  return (
    <ToggleButtonGroup
      exclusive
      fullWidth
      sx={{ '& .MuiToggleButton-root': { flex: '1 1 auto', px: '8px', whiteSpace: 'nowrap' } }}
      aria-label="Light or dark on this device"
      value={mode ?? 'system'}
      onChange={(_event, next: 'light' | 'dark' | 'system' | null) => next && setMode(next)}
    >
      <ToggleButton value="light">Light</ToggleButton>
      <ToggleButton value="dark">Dark</ToggleButton>
      <ToggleButton value="system">As the {device}</ToggleButton>
    </ToggleButtonGroup>
  );
}
