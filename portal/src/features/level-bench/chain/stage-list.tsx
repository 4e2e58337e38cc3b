import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useState } from 'react';
import { Icon } from '../../../shared-ui/icon';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { counted } from '../../../lib/text';
import { StageFields } from './stage-fields';
import {
  added,
  GREATEST_STAGES,
  moved,
  stagesOf,
  stagesText,
  withTyped,
  without,
  type StageTexts,
} from './stages';

interface StageListProps {
  /** The list as it stands in the address. */
  text: string;
  onChange: (text: string) => void;
  /** By place: `stages[2].gainDb`. */
  problems: Readonly<Record<string, string>>;
  open: number | undefined;
  onOpen: (index: number | undefined) => void;
}

function Row({
  stage,
  index,
  isOpen,
  onOpen,
}: {
  stage: StageTexts;
  index: number;
  isOpen: boolean;
  onOpen: () => void;
}) {
  return (
    <Box
      component="button"
      type="button"
      aria-expanded={isOpen}
      onClick={onOpen}
      sx={{
        display: 'grid',
        gridTemplateColumns: '20px minmax(0, 1fr) auto 14px',
        alignItems: 'center',
        gap: '8px',
        width: '100%',
        minHeight: { xs: 48, md: 36 },
        p: isOpen ? '0 10px' : 0,
        border: 0,
        background: 'none',
        color: 'token.ink',
        font: 'inherit',
        textAlign: 'left',
        cursor: 'pointer',
      }}
    >
      <Box component="span" sx={{ color: 'token.ink3', fontWeight: 600 }}>
        {index + 1}
      </Box>
      <Box component="span" sx={{ fontWeight: isOpen ? 700 : 400, overflowWrap: 'anywhere' }}>
        {stage.name || 'No name yet'}
      </Box>
      <span>
        <b>{stage.gainDb.replace('-', '−')}</b>
        {stage.toleranceDb && (
          <Box component="span" sx={{ color: 'token.ink2' }}>
            {` ± ${stage.toleranceDb}`}
          </Box>
        )}
      </span>
      <Icon name={isOpen ? 'up' : 'down'} size={14} />
    </Box>
  );
}

const stageId = (index: number): string => `stage-${index}`;

/** Brings a stage's fields into sight, where they are opened from elsewhere on the page. */
export const showStage = (index: number): void =>
  document.getElementById(stageId(index))?.scrollIntoView?.({ block: 'center' });

/** The stages in signal order; one of them open to be typed in. */
export function StageList({ text, onChange, problems, open, onOpen }: StageListProps) {
  const stages = stagesOf(text);
  const [said, say] = useState('');
  const change = (next: StageTexts[], words: string, shown: number | undefined) => {
    onChange(stagesText(next));
    onOpen(shown);
    say(words);
  };
  return (
    <Box component="section" aria-label="Stages" sx={{ mb: '18px' }}>
      <SectionHeading end="gain ± window, dB">Stages</SectionHeading>
      <Box component="ol" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {stages.map((stage, index) => {
          const isOpen = index === open;
          const name = stage.name || 'The stage';
          return (
            <Box
              component="li"
              id={stageId(index)}
              // A stage is where it stands; its name may be typed over at any time.
              key={index}
              sx={
                isOpen
                  ? {
                      border: '1.5px solid',
                      borderColor: 'token.ink',
                      borderRadius: '3px',
                      backgroundColor: 'token.sheet',
                    }
                  : { borderBottom: '1px solid', borderColor: 'token.rule' }
              }
            >
              <Row
                stage={stage}
                index={index}
                isOpen={isOpen}
                onOpen={() => onOpen(isOpen ? undefined : index)}
              />
              {isOpen && (
                <StageFields
                  stage={stage}
                  problemOf={(field) => problems[`stages[${index}].${field}`]}
                  onType={(field, typed) => onChange(stagesText(withTyped(stages, index, field, typed)))}
                  onUp={
                    index > 0
                      ? () => change(moved(stages, index, -1), `${name} moved up.`, index - 1)
                      : undefined
                  }
                  onDown={
                    index < stages.length - 1
                      ? () => change(moved(stages, index, 1), `${name} moved down.`, index + 1)
                      : undefined
                  }
                  onRemove={
                    stages.length > 1
                      ? () => change(without(stages, index), `${name} removed.`, undefined)
                      : undefined
                  }
                />
              )}
            </Box>
          );
        })}
      </Box>
      {stages.length < GREATEST_STAGES && (
        <Button
          variant="text"
          startIcon={<Icon name="plus" size={16} />}
          sx={{ mt: '4px', px: 0 }}
          onClick={() => change(added(stages), 'A stage added.', stages.length)}
        >
          Add a stage
        </Button>
      )}
      <Box role="status" sx={{ typography: 'small', color: 'token.ink2' }}>
        {said && `${said} ${counted(stages.length, 'stage')} now.`}
      </Box>
    </Box>
  );
}
