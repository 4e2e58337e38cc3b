import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { OWN_PAGES } from '../pages';

const KEYS: readonly (readonly [string, string])[] = [
  ...OWN_PAGES.flatMap((page) =>
    'letter' in page ? [[`G, ${page.letter.toUpperCase()}`, page.words] as const] : [],
  ),
  ['?', 'This list'],
  ['Left, Right', 'On the stage strip and the level diagram: the next stage'],
  ['Home, End', 'The first and the last stage'],
  ['Enter', 'Opens what is in focus'],
  ['T', 'In the level diagram: its table'],
  ['Escape', 'Closes a drawer and keeps its draft'],
];

export function KeyList({ open, onClose }: { open: boolean; onClose: () => void }) {
  return (
    <Dialog open={open} onClose={onClose} aria-labelledby="key-list" maxWidth="xs" fullWidth>
      <DialogTitle id="key-list">Keys</DialogTitle>
      <DialogContent>
        <Box
          component="dl"
          sx={{ display: 'grid', gridTemplateColumns: 'max-content 1fr', gap: '8px 20px', m: 0 }}
        >
          {KEYS.map(([keys, words]) => (
            <Box key={keys} sx={{ display: 'contents' }}>
              <Box component="dt" sx={{ fontWeight: 700 }}>
                {keys}
              </Box>
              <Box component="dd" sx={{ m: 0 }}>
                {words}
              </Box>
            </Box>
          ))}
        </Box>
      </DialogContent>
      <DialogActions>
        <Button onClick={onClose}>Close</Button>
      </DialogActions>
    </Dialog>
  );
}
