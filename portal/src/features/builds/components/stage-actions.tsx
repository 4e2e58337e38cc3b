import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { carryOut } from '../../../api-client/carry-out';
import { listText } from '../../../lib/text';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { TextField } from '../../../shared-ui/fields/text-field';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { useDraft } from '../../../shared-ui/use-draft';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import { useMoveStage, type BuildStage } from '../api/builds';
import { isInHand, missingTitles } from '../logic/stage';

/** Sends the stage to a mentor, once nothing is missing; or takes it back while it is there. */
export function StageActions({ buildId, stage }: { buildId: string; stage: BuildStage }) {
  const moving = useMoveStage(buildId, stage.id);
  const note = useDraft(`note:${buildId}:${stage.id}`, '');
  const [isAsking, setIsAsking] = useState(false);
  const say = useToast();
  if (stage.state === 'with mentor')
    return (
      <Button onClick={() => moving.mutate({ move: 'withdraw', note: '' })} loading={moving.isPending}>
        Take it back
      </Button>
    );
  if (!isInHand(stage)) return null;
  if (stage.missingToSend > 0) {
    const left = stage.missingToSend === 1 ? '1 check left' : `${stage.missingToSend} checks left`;
    return (
      <WaitingButton reason={`Still missing: ${listText(missingTitles(stage))}.`}>
        Send to mentor, {left}
      </WaitingButton>
    );
  }
  const send = () =>
    carryOut(
      moving,
      { move: 'submit', note: note.value },
      {
        onSuccess: () => {
          note.drop();
          setIsAsking(false);
          say(`Stage ${stage.position} sent to a mentor.`);
        },
      },
    );
  return (
    <>
      <Button variant="contained" onClick={() => setIsAsking(true)}>
        Send to mentor
      </Button>
      <ConfirmDialog
        open={isAsking}
        title={`Send stage ${stage.position} ${stage.name} to a mentor?`}
        act="Send to mentor"
        stay="Keep it on the bench"
        isBusy={moving.isPending}
        onAct={send}
        onStay={() => setIsAsking(false)}
      >
        <Typography variant="body1" sx={{ mb: '12px' }}>
          A mentor sees every reading and photo. You can take it back until somebody has decided.
        </Typography>
        <TextField
          label="A word for the mentor, if you like"
          value={note.value}
          onChange={note.setValue}
          rows={3}
          maxLength={1000}
          hint={note.keptAt && `Kept as you type, ${note.keptAt}`}
        />
        {moving.isError && <ProblemAlert title="Not sent yet." error={moving.error} />}
      </ConfirmDialog>
    </>
  );
}
