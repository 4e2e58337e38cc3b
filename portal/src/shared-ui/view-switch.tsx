import ToggleButton from '@mui/material/ToggleButton';
import ToggleButtonGroup from '@mui/material/ToggleButtonGroup';
import { Icon } from './icon';

interface ViewSwitchProps<T extends string> {
  value: T | 'table';
  /** The value that stands for the drawing, and its word. */
  drawing: T;
  words: string;
  onChange: (value: T | 'table') => void;
}

/** Drawing or table, small at the end of a section's heading. */
export function ViewSwitch<T extends string>({ value, drawing, words, onChange }: ViewSwitchProps<T>) {
  return (
    <ToggleButtonGroup
      exclusive
      aria-label={`${words} or table`}
      value={value}
      onChange={(_event, next: T | 'table' | null) => next && onChange(next)}
      sx={{
        '& .MuiToggleButton-root': {
          minHeight: { xs: 44, md: 26 },
          flex: 'none',
          gap: '6px',
          py: 0,
          fontSize: '0.78125rem',
          '&.Mui-selected, &.Mui-selected:hover': { backgroundColor: 'token.ink', color: 'token.paper' },
        },
      }}
    >
      <ToggleButton value={drawing}>{words}</ToggleButton>
      <ToggleButton value="table">
        <Icon name="table" size={14} />
        Table
      </ToggleButton>
    </ToggleButtonGroup>
  );
}
