import Box from '@mui/material/Box';

interface FilterWordsProps<T extends string> {
  label: string;
  value: T;
  options: readonly { value: T; words: string }[];
  onChange: (value: T) => void;
}

/** Words above a table that filter it; the chosen one stands on a green foot. */
export function FilterWords<T extends string>({ label, value, options, onChange }: FilterWordsProps<T>) {
  return (
    <Box role="group" aria-label={label} sx={{ display: 'flex', flexWrap: 'wrap', gap: '0 18px' }}>
      {options.map((option) => (
        <Box
          component="button"
          type="button"
          key={option.value}
          aria-pressed={option.value === value}
          onClick={() => onChange(option.value)}
          sx={{
            minHeight: 44,
            p: 0,
            border: 0,
            borderBottom: '3px solid',
            borderColor: option.value === value ? 'token.green' : 'transparent',
            background: 'none',
            color: option.value === value ? 'token.ink' : 'token.ink2',
            font: 'inherit',
            fontWeight: option.value === value ? 700 : 600,
            cursor: 'pointer',
          }}
        >
          {option.words}
        </Box>
      ))}
    </Box>
  );
}
