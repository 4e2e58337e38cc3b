import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link as RouterLink, useNavigate } from 'react-router-dom';
import { Icon } from '../../../shared-ui/icon';
import { LevelDiagram } from '../../../shared-ui/level-diagram/level-diagram';
import type { LevelBeingEntered } from '../../../shared-ui/level-diagram/level-point';
import { usePhone } from '../../../shared-ui/use-phone';
import type { Build, BuildCheck, BuildStage } from '../api/builds';
import { liveGain } from '../logic/live-reading';
import { levelPointsOf, readingInForce } from '../logic/stage';
import { useReadingForm, type ReadingFormState } from '../logic/use-reading-form';
import { AllCautions, MildCautions } from './caution-ticks';
import { Checklist } from './checklist';
import { OpenCheck } from './open-check';

interface StageWorkProps {
  build: Build;
  stage: BuildStage;
  check: BuildCheck;
  onOpen: (checkId: string) => void;
  /** After a check was settled: the page goes on to the next. */
  onDone: () => void;
}

const COLUMNS = {
  display: 'grid',
  gridTemplateColumns: { xs: 'minmax(0, 1fr)', lg: 'minmax(0, 465px) minmax(0, 1fr)' },
  gap: '24px 30px',
  alignItems: 'start',
};

function beingEntered(form: ReadingFormState): LevelBeingEntered | undefined {
  const { live, check } = form;
  if (live.state !== 'read' || check.levelPointId === null) return undefined;
  const { value, expandedUncertainty } = live.reading;
  const isTouched = form.keptAt !== undefined;
  if (!isTouched) return undefined;
  return {
    pointId: check.levelPointId,
    levelDbm: value,
    expandedUncertaintyDb: expandedUncertainty,
    verdict: live.verdict,
  };
}

/** A stage in its builder's hands: the checklist with one form open, and the level diagram that moves with it. */
export function StageWork({ build, stage, check, onOpen, onDone }: StageWorkProps) {
  const isPhone = usePhone();
  const form = useReadingForm(build.id, stage, check, (verdict) => verdict === 'pass' && onDone());
  const point = build.levelPoints.find(({ id }) => id === check.levelPointId);
  const levelOf = (checkId: string) => {
    if (checkId === check.id && form.live.state === 'read') return form.live.reading;
    const reading = readingInForce(stage.checks.find(({ id }) => id === checkId) ?? { readings: [] });
    return reading && asLevel(reading);
  };
  const previewOf = (other: BuildCheck) =>
    other.fromCheckIds.includes(check.id) && form.keptAt !== undefined ? liveGain(other, levelOf) : undefined;
  const open = (
    <OpenCheck
      {...{ buildId: build.id, stage, check, form, onDone }}
      testPoint={point?.testPoint}
      aside={isPhone && <LevelsLink buildId={build.id} />}
    />
  );
  if (isPhone)
    return (
      <Box sx={{ display: 'grid', gap: '20px' }}>
        {open}
        <Checklist stage={stage} previewOf={previewOf} onOpen={onOpen} />
      </Box>
    );
  return (
    <Box sx={COLUMNS}>
      <Checklist {...{ stage, open, previewOf, onOpen }} openId={check.id} />
      <div>
        <StageDiagram build={build} stage={stage} entered={beingEntered(form)} />
        <MildCautions cautions={stage.cautions} />
      </div>
    </Box>
  );
}

function asLevel({
  value,
  unit,
  expandedUncertainty,
}: {
  value: number;
  unit: string;
  expandedUncertainty: number;
}) {
  // Only levels feed a gain; the plan was checked for that when it was published.
  return unit === 'dBm'
    ? { value, unit: 'dBm' as const, uncertaintyUnit: 'dB' as const, expandedUncertainty }
    : undefined;
}

function LevelsLink({ buildId }: { buildId: string }) {
  return (
    <Box
      component="span"
      sx={{ display: 'inline-flex', alignItems: 'center', gap: '6px', color: 'token.green' }}
    >
      <Icon name="levelBench" size={18} />
      <Link component={RouterLink} to={`/build/${buildId}/levels`}>
        Level diagram
      </Link>
    </Box>
  );
}

/** The level diagram of a build, at the point of this stage; a point opens its stage. */
function StageDiagram({
  build,
  stage,
  entered,
}: {
  build: Build;
  stage: BuildStage;
  entered?: LevelBeingEntered;
}) {
  const navigate = useNavigate();
  const own = build.levelPoints.filter(({ stageId }) => stageId === stage.id).at(-1);
  const open = (pointId: string) => {
    const stageId = build.levelPoints.find(({ id }) => id === pointId)?.stageId;
    if (stageId) void navigate(`/build/${build.id}/stages/${stageId}`);
  };
  if (build.levelPoints.length === 0) return <Typography>This plan has no level points.</Typography>;
  return (
    <LevelDiagram
      points={levelPointsOf(build)}
      entered={entered}
      currentId={entered?.pointId ?? own?.id}
      onOpen={open}
    />
  );
}

/** Signed off: what it warned of is done with. */
const isShut = ({ state }: BuildStage): boolean => state === 'signed off';

/** A stage that is closed or not open yet: its record beside the diagram, nothing to type. */
export function StageRecord({ build, stage }: { build: Build; stage: BuildStage }) {
  const isPhone = usePhone();
  const cautions = isShut(stage) ? null : <AllCautions cautions={stage.cautions} />;
  return (
    <Box sx={COLUMNS}>
      <div>
        {isPhone && cautions}
        <Checklist stage={stage} isRecord />
      </div>
      {isPhone ? (
        <LevelsLink buildId={build.id} />
      ) : (
        <div>
          <StageDiagram build={build} stage={stage} />
          {cautions}
        </div>
      )}
    </Box>
  );
}
