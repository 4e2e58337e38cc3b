import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { carryOut } from '../../../api-client/carry-out';
import { myBuildSummariesQuery } from '../../../api-client/my-builds';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { SelectField } from '../../../shared-ui/fields/select-field';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import type { Family } from '../frame/families';
import { placeOf, usePutWorksheet, type Place } from './worksheets';

interface PutOnBuildProps {
  family: Family;
  /** The address with what was typed. */
  link: () => string;
  /** The result as plain lines; none while there is no result. */
  text: string | undefined;
}

/** Puts a result on a stage of one's own build, for oneself and for the mentor who looks at it. */
export function PutOnBuild({ family, link, text }: PutOnBuildProps) {
  const [isOpen, setIsOpen] = useState(false);
  const builds = useQuery(myBuildSummariesQuery);
  const place = placeOf(builds.data ?? []);
  if (!place) return null;
  return (
    <>
      <Button disabled={text === undefined} onClick={() => setIsOpen(true)}>
        Put this on my build
      </Button>
      {isOpen && text !== undefined && (
        <ChooseStage {...{ family, link, text, place }} onDone={() => setIsOpen(false)} />
      )}
    </>
  );
}

interface ChooseStageProps extends PutOnBuildProps {
  text: string;
  place: Place;
  onDone: () => void;
}

function ChooseStage({ family, link, text, place, onDone }: ChooseStageProps) {
  const { buildId, stages, currentStageId } = place;
  const [stageId, setStageId] = useState(currentStageId);
  const putting = usePutWorksheet();
  const say = useToast();
  const put = () => {
    const inputs = new URL(link()).search.replace(/^\?/, '');
    const words = stages.find(({ id }) => id === stageId)?.words ?? '';
    carryOut(
      putting,
      { buildId, stageId, family, inputs, result: text },
      {
        onSuccess: () => {
          say(`Put on stage ${words}.`);
          onDone();
        },
      },
    );
  };
  return (
    <ConfirmDialog
      open
      title="Put this on your build?"
      act="Put it there"
      stay="Not now"
      isBusy={putting.isPending}
      onAct={put}
      onStay={onDone}
    >
      <SelectField
        label="Stage"
        value={stageId}
        onChange={setStageId}
        options={stages.map(({ id, words }) => ({ value: id, label: words }))}
      />
      <Typography sx={{ mt: '10px' }}>
        It stands beside the readings as a note, with what you typed, and opens here again. No verdict rests
        on it.
      </Typography>
      {putting.isError && <ProblemAlert error={putting.error} title="It was not put there." />}
    </ConfirmDialog>
  );
}
