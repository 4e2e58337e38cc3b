import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { FOCUS_BACK } from '../../../shared-ui/use-focus-back';
import { Icon } from '../../../shared-ui/icon';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { ViewSwitch } from '../../../shared-ui/view-switch';
import type { BookView } from '../book-view';
import type { Lane } from '../lanes/lane';
import { LaneMenu } from './shown-choice';

interface PhoneBookBarProps {
  view: BookView;
  all: readonly Lane[];
  shown: readonly Lane[];
  /** Left out while the form is open: then the lanes have the room. */
  onBook?: () => void;
}

/** The head of the page on a phone: its name and what is shown in the bar, then lanes or list and the form. */
export function PhoneBookBar({ view, all, shown, onBook }: PhoneBookBarProps) {
  const isLanes = view.kind === 'lanes';
  return (
    <>
      <VisuallyHidden>
        <h1>Bench book</h1>
      </VisuallyHidden>
      <PhoneBar
        title="Bench book"
        end={
          isLanes && (
            <LaneMenu
              all={all}
              shown={shown}
              onChange={view.showTags}
              label={`${shown.length} shown, choose`}
              isPlain
            >
              <Icon name="filter" size={18} />
              {shown.length} shown
            </LaneMenu>
          )
        }
      />
      {onBook && (
        <Box sx={{ display: 'flex', justifyContent: 'space-between', gap: '8px', mb: '8px' }}>
          <ViewSwitch
            value={isLanes ? 'lanes' : 'table'}
            drawing="lanes"
            words="Lanes"
            onChange={(next) => view.showKind(next === 'table' ? 'list' : 'lanes')}
          />
          <Button variant="contained" onClick={onBook} {...FOCUS_BACK}>
            Book a bench
          </Button>
        </Box>
      )}
    </>
  );
}
