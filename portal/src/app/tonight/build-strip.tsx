import Box from '@mui/material/Box';
import { useNavigate } from 'react-router-dom';
import { useMyBuilds } from '../../features/builds/api/builds';
import { cautionsOf } from '../../features/builds/logic/cautions';
import { findStage } from '../../features/builds/logic/stage';
import { serialText } from '../../features/builds/logic/words';
import { capital, countWord, listText } from '../../lib/text';
import { CautionBox } from '../../shared-ui/caution-box';
import { SectionHeading } from '../../shared-ui/section-heading';
import { StageStrip } from '../../shared-ui/stage-strip';

/** Cautions of the stage one is on, before anything is switched on. */
export function BeforeYouSwitchOn() {
  const builds = useMyBuilds();
  const [build] = builds.data ?? [];
  const stage = build && findStage(build, build.currentStageId);
  const cautions = stage && stage.state !== 'signed off' ? cautionsOf(stage.cautions) : [];
  if (cautions.length === 0) return null;
  return (
    <section aria-labelledby="switch-on">
      <SectionHeading id="switch-on">Before you switch on</SectionHeading>
      <Box sx={{ display: 'grid', gap: '8px', pt: '12px' }}>
        {cautions.map(({ kind, text }) => (
          <CautionBox key={kind} kind={kind}>
            {text}
          </CautionBox>
        ))}
      </Box>
    </section>
  );
}

/** 'Seven signed off, one with mentor, four to go'. */
function progressText(states: readonly string[]): string {
  const count = (wanted: string): number => states.filter((state) => state === wanted).length;
  const [signed, waiting] = [count('signed off'), count('with mentor')];
  const rest = states.length - signed - waiting;
  const parts = [
    signed > 0 ? `${countWord(signed)} signed off` : '',
    waiting > 0 ? `${countWord(waiting)} with mentor` : '',
    rest > 0 ? `${countWord(rest)} to go` : '',
  ].filter(Boolean);
  return capital(listText(parts).replace(' and ', ', '));
}

export function BuildStrip() {
  const builds = useMyBuilds();
  const navigate = useNavigate();
  const [build] = builds.data ?? [];
  if (!build) return null;
  const name = `${build.planName}, ${serialText(build.serial)}`;
  return (
    <section aria-labelledby="strip">
      <Box sx={{ mb: '14px' }}>
        <SectionHeading id="strip" end={progressText(build.stages.map(({ state }) => state))}>
          {name}
        </SectionHeading>
      </Box>
      <StageStrip
        label={`Stages of ${name}`}
        openId={build.currentStageId ?? undefined}
        onOpen={(id) => void navigate(`/build/${build.id}/stages/${id}`)}
        stages={build.stages.map(({ id, position, name: stageName, state }) => ({
          id,
          number: position,
          name: stageName,
          state,
        }))}
      />
    </section>
  );
}
