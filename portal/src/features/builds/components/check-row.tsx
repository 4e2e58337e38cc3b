import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';
import { counted } from '../../../lib/text';
import { StateLine, VerdictLine } from '../../../shared-ui/states/state-line';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import type { BuildCheck, BuildStage, Reading } from '../api/builds';
import { readingInForce } from '../logic/stage';
import { readingWords } from '../logic/words';

export interface CheckRowProps {
  check: BuildCheck;
  stage: BuildStage;
  /** What a gain would come to with the level being typed. */
  preview?: Pick<Reading, 'value' | 'unit' | 'uncertaintyUnit' | 'expandedUncertainty'>;
  onOpen?: () => void;
  /** Below the row's line: tries, photos, who ticked it. */
  children?: ReactNode;
}

/** One line of the checklist: number, name, what it came to, and its state in shape and word. */
export function CheckRow({ check, stage, preview, onOpen, children }: CheckRowProps) {
  const { position, title, method } = check;
  const remark = method === 'gain' ? 'works itself out' : method === 'carried' ? 'carried over' : undefined;
  return (
    <Box component="li" sx={{ borderBottom: '1px solid', borderColor: 'token.rule' }}>
      <Box
        {...(onOpen ? { component: 'button' as const, type: 'button', onClick: onOpen } : {})}
        sx={{
          display: 'grid',
          gridTemplateColumns: { xs: '20px minmax(0, 1fr) auto', md: '20px minmax(0, 1fr) auto 108px' },
          alignItems: 'center',
          gap: '0 8px',
          width: '100%',
          minHeight: 44,
          p: '6px 0',
          border: 0,
          background: 'transparent',
          color: 'token.ink',
          font: 'inherit',
          textAlign: 'left',
          cursor: onOpen ? 'pointer' : 'default',
        }}
      >
        <Typography variant="small" component="span" sx={{ color: 'token.ink3', fontWeight: 600 }}>
          {position}
        </Typography>
        <span>
          {title}
          {remark && (
            <Typography variant="small" component="span" sx={{ ml: '6px', color: 'token.ink2' }}>
              {remark}
            </Typography>
          )}
        </span>
        <Value check={check} preview={preview} />
        <Box component="span" sx={{ gridColumn: { xs: '2 / -1', md: 'auto' }, justifySelf: { md: 'end' } }}>
          <CheckState check={check} stage={stage} />
        </Box>
      </Box>
      {children}
    </Box>
  );
}

function Value({ check, preview }: Pick<CheckRowProps, 'check' | 'preview'>) {
  const reading = preview ?? readingInForce(check);
  if (check.kind === 'photo' && check.photos.length > 0)
    return (
      <Typography variant="small" component="span" sx={{ color: 'token.ink2' }}>
        {counted(check.photos.length, 'photo')}
      </Typography>
    );
  if (!reading) return <span />;
  const { value, unit, plusMinus } = readingWords(reading, 1);
  return (
    <Box component="span" sx={{ whiteSpace: 'nowrap', color: preview ? 'token.ink2' : 'token.ink' }}>
      <b>
        {value} {unit}
      </b>{' '}
      {plusMinus}
    </Box>
  );
}

/** A check's state; a value that works itself out says which checks it waits for. */
function CheckState({ check, stage }: Pick<CheckRowProps, 'check' | 'stage'>) {
  const reading = readingInForce(check);
  if (check.kind === 'measure' && reading)
    return <VerdictLine verdict={reading.verdict}>{VERDICTS[reading.verdict].short}</VerdictLine>;
  if (check.isSettled)
    return (
      <StateLine shape="tick" colour="green">
        {SETTLED[check.kind]}
      </StateLine>
    );
  const waitsOn = check.fromCheckIds
    .map((id) => stage.checks.find((other) => other.id === id)?.position)
    .filter((position) => position !== undefined);
  return (
    <StateLine shape="ring" colour="ink3">
      {waitsOn.length > 0
        ? `Waits on ${waitsOn.join(' and ')}`
        : check.kind === "mentor's eyes"
          ? 'For a mentor'
          : 'To do'}
    </StateLine>
  );
}

const SETTLED: Record<BuildCheck['kind'], string> = {
  measure: 'Pass',
  photo: 'Kept',
  tick: 'Done',
  safety: 'Acknowledged',
  "mentor's eyes": 'Seen',
};
