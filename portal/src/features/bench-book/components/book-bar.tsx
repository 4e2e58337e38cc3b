import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { BookView } from '../book-view';
import { ViewSwitch } from '../../../shared-ui/view-switch';
import type { Lane } from '../lanes/lane';
import { ShownChoice } from './shown-choice';

interface BookBarProps {
  view: BookView;
  all: readonly Lane[];
  shown: readonly Lane[];
  isEmpty: boolean;
}

/** Under the title: what stands side by side, and lanes or list. */
export function BookBar({ view, all, shown, isEmpty }: BookBarProps) {
  const isLanes = view.kind === 'lanes';
  const hint = isEmpty ? 'An open week. Pick a time to book it.' : 'Up to three side by side';
  return (
    <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '8px 14px', mb: '10px' }}>
      {isLanes && <ShownChoice all={all} shown={shown} onChange={view.showTags} />}
      <Box sx={{ flex: 1 }} />
      {isLanes && (
        <Typography variant="small" sx={{ color: 'token.ink2', textAlign: 'right' }}>
          {hint}
        </Typography>
      )}
      <ViewSwitch
        value={isLanes ? 'lanes' : 'table'}
        drawing="lanes"
        words="Lanes"
        onChange={(next) => view.showKind(next === 'table' ? 'list' : 'lanes')}
      />
    </Box>
  );
}
