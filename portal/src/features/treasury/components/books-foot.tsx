import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import { counted } from '../../../lib/text';
import { TextField } from '../../../shared-ui/fields/text-field';

interface BooksFootProps {
  find: string;
  /** Open items there is no room for. */
  hidden: number;
  /** Open items the server did not send. */
  leftOut: number;
  isWhole: boolean;
  onFind: (find: string) => void;
  onWhole: (isWhole: boolean) => void;
}

/** Finds an open item by name or number, or shows them all. */
export function BooksFoot({ find, hidden, leftOut, isWhole, onFind, onWhole }: BooksFootProps) {
  return (
    <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'flex-end', gap: '10px 20px', mt: '10px' }}>
      <Box sx={{ flex: '0 1 240px' }}>
        <TextField
          label="Find a name or number"
          type="search"
          value={find}
          onChange={onFind}
          maxLength={80}
        />
      </Box>
      <Box sx={{ typography: 'small', color: 'token.ink2', pb: '12px' }}>
        {(hidden > 0 || isWhole) && (
          <Link component="button" onClick={() => onWhole(!isWhole)}>
            {isWhole ? 'Show fewer' : `Show ${counted(hidden, 'open item')} more`}
          </Link>
        )}
        {leftOut > 0 && ` ${leftOut} due later are left out`}
      </Box>
    </Box>
  );
}
