import Box from '@mui/material/Box';
import { Fragment, useEffect, useRef, type KeyboardEvent } from 'react';
import { StateMark } from './states/shape';
import { STAGE_STATES, type StageState } from './states/state-words';
import { token } from './tokens';

export interface StripStage {
  id: string;
  number: number;
  name: string;
  state: StageState;
}

interface StageStripProps {
  stages: readonly StripStage[];
  openId?: string;
  onOpen: (id: string) => void;
  /** Names the row for a screen reader: "Stages of Larkmoor Twenty, serial 07". */
  label: string;
}

const GROUND: Partial<Record<StageState, string>> = {
  'signed off': token('greenTint'),
  'sent back': token('copperTint'),
};

const STEPS: Record<string, (at: number, count: number) => number> = {
  ArrowRight: (at, count) => Math.min(count - 1, at + 1),
  ArrowLeft: (at) => Math.max(0, at - 1),
  Home: () => 0,
  End: (_at, count) => count - 1,
};

/** A build's stages as tabs standing on an ink rule; the open one joins the page. Arrows move, Enter opens. */
export function StageStrip({ stages, openId, onOpen, label }: StageStripProps) {
  const row = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const open = row.current?.querySelector<HTMLElement>('[aria-selected="true"]');
    if (row.current && open)
      row.current.scrollLeft = open.offsetLeft + open.offsetWidth / 2 - row.current.clientWidth / 2;
  }, [openId]);
  const onKeyDown = (event: KeyboardEvent<HTMLDivElement>) => {
    const tabs = [...event.currentTarget.querySelectorAll<HTMLElement>('[role="tab"]')];
    const at = tabs.findIndex((tab) => tab === document.activeElement);
    const step = STEPS[event.key];
    if (!step || at < 0) return;
    event.preventDefault();
    tabs[step(at, tabs.length)]?.focus();
  };
  const tabStop = stages.some(({ id }) => id === openId) ? openId : stages[0]?.id;
  return (
    <Box
      ref={row}
      role="tablist"
      aria-label={label}
      onKeyDown={onKeyDown}
      sx={{
        position: 'relative',
        display: 'flex',
        alignItems: 'flex-end',
        gap: { xs: '6px', md: '4px' },
        height: 78,
        mx: { xs: '-16px', md: 0 },
        overflowX: 'auto',
        overflowY: 'hidden',
        scrollbarWidth: 'none',
        boxShadow: `inset 0 -1.5px 0 ${token('ink')}`,
      }}
    >
      {stages.map((stage) => (
        <StageTab
          key={stage.id}
          stage={stage}
          isOpen={stage.id === openId}
          isTabStop={stage.id === tabStop}
          onOpen={() => onOpen(stage.id)}
        />
      ))}
    </Box>
  );
}

interface StageTabProps {
  stage: StripStage;
  isOpen: boolean;
  isTabStop: boolean;
  onOpen: () => void;
}

const CLOSED = { height: 69, borderColor: 'token.rule', mb: '1.5px' };
const OPEN = {
  height: 77,
  pt: '7px',
  borderColor: 'token.ink',
  borderWidth: '1.5px',
  borderTop: `4px solid ${token('green')}`,
  backgroundColor: 'token.sheet',
};

function StageTab({ stage, isOpen, isTabStop, onOpen }: StageTabProps) {
  const { shape, words, colour } = STAGE_STATES[stage.state];
  return (
    <Box
      component="button"
      type="button"
      role="tab"
      aria-selected={isOpen}
      aria-label={`Stage ${stage.number}, ${stage.name}, ${stage.state}`}
      tabIndex={isTabStop ? 0 : -1}
      onClick={onOpen}
      sx={{
        position: 'relative',
        flex: { xs: '0 0 104px', md: '1 1 0' },
        minWidth: { md: 76 },
        display: 'flex',
        flexDirection: 'column',
        overflow: 'hidden',
        p: '6px 7px 4px 9px',
        border: '1px solid',
        borderBottom: '0 !important',
        borderRadius: '4px 4px 0 0',
        backgroundColor: GROUND[stage.state] ?? token('sunk'),
        color: isOpen ? 'token.ink' : 'token.ink2',
        font: 'inherit',
        fontSize: '0.71875rem',
        lineHeight: '0.875rem',
        fontWeight: isOpen ? 700 : 600,
        textAlign: 'left',
        cursor: 'pointer',
        '&:focus-visible': { outlineOffset: -3 },
        ...(isOpen ? OPEN : CLOSED),
      }}
    >
      <Box
        component="span"
        sx={{ display: 'flex', justifyContent: 'space-between', width: '100%', mb: '2px' }}
      >
        <Box component="span" sx={{ color: isOpen ? 'token.ink' : 'token.ink2', fontSize: '0.6875rem' }}>
          {stage.number}
        </Box>
        <Box
          component="span"
          sx={{ color: stage.state === 'on the bench' ? 'token.green' : `token.${colour}`, lineHeight: 0 }}
        >
          <StateMark name={shape} size={13} />
        </Box>
      </Box>
      <Box
        component="span"
        sx={{ display: '-webkit-box', WebkitBoxOrient: 'vertical', WebkitLineClamp: '2', overflow: 'hidden' }}
      >
        {stage.name.split(' ').map((word) => (
          <Fragment key={word}>
            <span style={{ whiteSpace: 'nowrap' }}>{word}</span>{' '}
          </Fragment>
        ))}
      </Box>
      <Box
        component="span"
        sx={{
          mt: 'auto',
          color: `token.${colour}`,
          fontSize: '0.6875rem',
          fontWeight: 700,
          whiteSpace: 'nowrap',
        }}
      >
        {words}
      </Box>
    </Box>
  );
}
