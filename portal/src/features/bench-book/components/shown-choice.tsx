import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Menu from '@mui/material/Menu';
import MenuItem from '@mui/material/MenuItem';
import { useState, type ReactNode } from 'react';
import { Icon } from '../../../shared-ui/icon';
import { MOST_LANES, type Lane } from '../lanes/lane';

interface ShownChoiceProps {
  all: readonly Lane[];
  shown: readonly Lane[];
  onChange: (tags: string[]) => void;
}

/** What stands side by side: each one shown as a ticked button, and a menu of the rest. */
export function ShownChoice({ all, shown, onChange }: ShownChoiceProps) {
  const without = (tag: string) => shown.filter((lane) => lane.tag !== tag).map((lane) => lane.tag);
  return (
    <Box
      role="group"
      aria-label="Benches and instruments shown"
      sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px' }}
    >
      {shown.map(({ tag, kind, name }) => (
        <Button
          key={tag}
          aria-pressed
          size="small"
          startIcon={<Icon name="check" size={14} />}
          onClick={() => shown.length > 1 && onChange(without(tag))}
          sx={{
            '&, &:hover': {
              borderColor: 'token.green',
              backgroundColor: 'token.greenTint',
              fontSize: '0.8125rem',
            },
          }}
        >
          {kind === 'bench' ? tag : `${tag} ${name.split(' ')[0] ?? ''}`}
        </Button>
      ))}
      <LaneMenu all={all} shown={shown} onChange={onChange} label="Bench or instrument">
        <Icon name="plus" size={15} /> Bench or instrument
      </LaneMenu>
    </Box>
  );
}

/** All benches and instruments to tick, at most three of them. */
export function LaneMenu({
  all,
  shown,
  onChange,
  label,
  children,
  isPlain = false,
}: ShownChoiceProps & { label: string; children: ReactNode; isPlain?: boolean }) {
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  const tags = shown.map(({ tag }) => tag);
  const toggle = (tag: string) => {
    if (!tags.includes(tag)) onChange([...tags, tag].slice(-MOST_LANES));
    else if (tags.length > 1) onChange(tags.filter((other) => other !== tag));
  };
  return (
    <>
      <Button
        size="small"
        variant={isPlain ? 'text' : 'outlined'}
        aria-haspopup="menu"
        aria-expanded={anchor !== null}
        aria-label={label}
        onClick={(event) => setAnchor(event.currentTarget)}
        sx={{ gap: '6px', fontSize: '0.8125rem' }}
      >
        {children}
      </Button>
      <Menu open={anchor !== null} anchorEl={anchor} onClose={() => setAnchor(null)}>
        {all.map(({ tag, name }) => (
          <MenuItem
            key={tag}
            role="menuitemcheckbox"
            aria-checked={tags.includes(tag)}
            onClick={() => toggle(tag)}
            sx={{ gap: '10px' }}
          >
            <Box component="span" sx={{ width: 16, color: 'token.green' }}>
              {tags.includes(tag) && <Icon name="check" size={16} />}
            </Box>
            <b>{tag}</b> {name}
          </MenuItem>
        ))}
      </Menu>
    </>
  );
}
