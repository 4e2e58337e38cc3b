import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { carryOut } from '../../../api-client/carry-out';
import { capital, counted, listText } from '../../../lib/text';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { CheckField } from '../../../shared-ui/fields/check-field';
import { TextField } from '../../../shared-ui/fields/text-field';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { StateMark } from '../../../shared-ui/states/shape';
import { useToast } from '../../../shared-ui/toasts';
import { useDraft } from '../../../shared-ui/use-draft';
import { useLetterKeys } from '../../../shared-ui/use-letter-keys';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import { useMark, useMoveStage, type Build, type BuildCheck, type BuildStage } from '../api/builds';

interface DecisionProps {
  build: Build;
  stage: BuildStage;
  isOwn: boolean;
  onDecided: () => void;
}

/** What the mentor saw, a word to the builder, and the two ways on. */
export function Decision({ build, stage, isOwn, onDecided }: DecisionProps) {
  const eyes = stage.checks.filter(({ kind }) => kind === "mentor's eyes");
  const note = useDraft(`review:${build.id}:${stage.id}`, '');
  const [isWordMissing, setIsWordMissing] = useState(false);
  const [isAsking, setIsAsking] = useState(false);
  const moving = useMoveStage(build.id, stage.id);
  const say = useToast();
  const first = build.stages.find(
    ({ position, state }) => position < stage.position && state !== 'signed off',
  );
  const canSign = !isOwn && stage.missingToSignOff === 0 && !first;
  const decide = (move: 'sign-off' | 'send-back', words: string) =>
    carryOut(
      moving,
      { move, note: note.value },
      {
        onSuccess: () => {
          note.drop();
          setIsAsking(false);
          say(words);
          onDecided();
        },
      },
    );
  const sendBack = () => {
    if (isOwn || moving.isPending) return;
    setIsWordMissing(note.value.trim() === '');
    if (note.value.trim()) decide('send-back', `Stage ${stage.position} went back to ${build.builder.name}.`);
  };
  const askToSign = () => setIsAsking(canSign);
  useLetterKeys({ s: askToSign, b: sendBack });
  if (isOwn)
    return (
      <Typography>Your own stage is signed off by another mentor. You can look, as they will.</Typography>
    );
  return (
    <Box sx={{ display: 'flex', flexDirection: 'column', gap: '12px', flex: 1 }}>
      {eyes.map((check) => (
        <Eye key={check.id} buildId={build.id} check={check} />
      ))}
      <TextField
        label={`Note to ${build.builder.name.split(' ')[0]}`}
        value={note.value}
        onChange={(text) => {
          note.setValue(text);
          setIsWordMissing(false);
        }}
        rows={4}
        maxLength={1000}
        error={isWordMissing ? 'Say what to do before it is sent again.' : undefined}
        hint={note.keptAt && `Kept as you type, ${note.keptAt}`}
      />
      {moving.isError && <ProblemAlert title="Not sent. Your note is kept." error={moving.error} />}
      <WaysOn {...{ stage, first, canSign, askToSign, sendBack }} isBusy={moving.isPending} />
      <ConfirmDialog
        open={isAsking}
        title={`Sign off stage ${stage.position} ${stage.name}?`}
        act="Sign off"
        stay="Not yet"
        isBusy={moving.isPending}
        onAct={() => decide('sign-off', `Stage ${stage.position} of ${build.builder.name} signed off.`)}
        onStay={() => setIsAsking(false)}
      >
        {build.builder.name}’s readings stay as they are from now on, under your name.
        {moving.isError && <ProblemAlert error={moving.error} />}
      </ConfirmDialog>
    </Box>
  );
}

interface WaysOnProps {
  stage: BuildStage;
  /** An earlier stage that feeds this one and is signed off before it. */
  first: BuildStage | undefined;
  canSign: boolean;
  isBusy: boolean;
  askToSign: () => void;
  sendBack: () => void;
}

function WaysOn({ stage, first, canSign, isBusy, askToSign, sendBack }: WaysOnProps) {
  const missing = first ? `Sign off stage ${first.position} ${first.name} first.` : missingText(stage);
  return (
    <Box
      sx={{
        display: 'grid',
        gap: '8px',
        m: 'auto -20px 0',
        p: '14px 20px 20px',
        borderTop: '1px solid',
        borderColor: 'token.rule',
        backgroundColor: 'token.sunk',
      }}
    >
      <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
        {missing} Signing off fixes these readings in the record under your name.
      </Typography>
      {canSign ? (
        <Button variant="contained" onClick={askToSign}>
          Sign off stage {stage.position}
        </Button>
      ) : (
        <WaitingButton reason={missing} fullWidth>
          Sign off stage {stage.position}
        </WaitingButton>
      )}
      <Button
        onClick={sendBack}
        loading={isBusy}
        startIcon={<StateMark name="back" />}
        sx={{ '&, &:hover': { color: 'token.copper', borderColor: 'token.copper' } }}
      >
        Send back
      </Button>
    </Box>
  );
}

function missingText(stage: BuildStage): string {
  const missing = stage.checks.filter(
    ({ isSettled, isRequired, kind }) => !isSettled && (isRequired || kind === 'safety'),
  );
  if (missing.length === 0) return 'Everything is settled.';
  const boxes = missing.filter(({ kind }) => kind === "mentor's eyes").length;
  if (boxes === missing.length) return `${capital(counted(boxes, 'box', 'boxes'))} still to tick.`;
  return `Still missing: ${listText(missing.map(({ title }) => title))}.`;
}

/** One thing a mentor looks at; the tick goes into the record with the mentor's name. */
function Eye({ buildId, check }: { buildId: string; check: BuildCheck }) {
  const marking = useMark(buildId);
  const isOn = marking.isPending ? marking.variables.isMarked : check.mark !== null;
  return (
    <CheckField
      label={check.title}
      hint={check.instruction}
      error={marking.isError ? 'Not kept. Tick it again.' : undefined}
      checked={isOn}
      onChange={(isMarked) => marking.mutate({ checkId: check.id, isMarked })}
    />
  );
}
