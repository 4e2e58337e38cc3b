import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import { Link as RouterLink, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { useMe } from '../../../api-client/session';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { StageStrip } from '../../../shared-ui/stage-strip';
import { StageStateLine } from '../../../shared-ui/states/state-line';
import { usePhone } from '../../../shared-ui/use-phone';
import { useBuild, type Build, type BuildStage } from '../api/builds';
import { BuildProblem, NoSuchStage } from '../components/no-such-build';
import { StageActions } from '../components/stage-actions';
import { StageStory } from '../components/stage-story';
import { StageRecord, StageWork } from '../components/stage-work';
import { Worksheets } from '../components/worksheets';
import { findStage, isInHand, isTyped, nextCheck } from '../logic/stage';
import { serialText } from '../logic/words';

/** Room at the end of a phone's page for the result that is pinned over it. */
const RESULT_HEIGHT = 240;

/** My build, one stage: is it good, and if not, what would settle it? */
export default function StagePage() {
  const { buildId = '', stageId = '' } = useParams();
  const build = useBuild(buildId);
  if (build.isPending) return <LoadingBars rows={8} label="Opening the stage" />;
  if (build.isError) return <BuildProblem error={build.error} onRetry={() => void build.refetch()} />;
  const stage = findStage(build.data, stageId);
  if (!stage) return <NoSuchStage buildId={buildId} currentStageId={build.data.currentStageId} />;
  return <Stage build={build.data} stage={stage} />;
}

function Stage({ build, stage }: { build: Build; stage: BuildStage }) {
  const me = useMe();
  const isPhone = usePhone();
  const navigate = useNavigate();
  const isOwn = build.builder.id === me.id;
  const name = `${build.planName}, ${serialText(build.serial)}`;
  const actions = isOwn && <StageActions key={stage.id} buildId={build.id} stage={stage} />;
  return (
    <>
      <PhoneBar
        title={`Stage ${stage.position} ${stage.name}`}
        subtitle={isOwn ? name : `${build.builder.name}, ${name}`}
        backTo="/"
        backLabel="Back to Tonight"
        end={<StageStateLine state={stage.state} />}
      />
      {!isPhone && (
        <PageTitle
          tab={`Stage ${stage.position} ${stage.name}`}
          over={
            <>
              {isOwn ? (
                <Link component={RouterLink} to="/build" color="inherit">
                  My build
                </Link>
              ) : (
                build.builder.name
              )}
              {` / ${name}`}
            </>
          }
          beside={<StageStateLine state={stage.state} />}
          actions={actions}
        >
          Stage {stage.position} <b>{stage.name}</b>
        </PageTitle>
      )}
      <StageStrip
        stages={build.stages.map(({ id, position, name: stageName, state }) => ({
          id,
          number: position,
          name: stageName,
          state,
        }))}
        openId={stage.id}
        onOpen={(id) => void navigate(`/build/${build.id}/stages/${id}`)}
        label={`Stages of ${name}`}
      />
      <Box sx={{ mt: '16px' }}>
        <StageStory stage={stage} />
      </Box>
      <StageBody build={build} stage={stage} isOwn={isOwn} />
      <Worksheets buildId={build.id} stageId={stage.id} isOwn={isOwn && isInHand(stage)} />
      {isPhone && actions && <Box sx={{ mt: '20px', display: 'grid' }}>{actions}</Box>}
      {isPhone && isOwn && isInHand(stage) && <Box aria-hidden sx={{ height: RESULT_HEIGHT }} />}
    </>
  );
}

function StageBody({ build, stage, isOwn }: { build: Build; stage: BuildStage; isOwn: boolean }) {
  const [query, setQuery] = useSearchParams();
  const asked = stage.checks.find(({ id }) => id === query.get('check'));
  const check = asked ?? nextCheck(stage) ?? stage.checks.find(isTyped);
  const open = (checkId?: string) =>
    setQuery(checkId ? { check: checkId } : {}, { replace: true, preventScrollReset: true });
  if (!isOwn || !isInHand(stage) || !check) return <StageRecord build={build} stage={stage} />;
  return (
    <StageWork key={check.id} build={build} stage={stage} check={check} onOpen={open} onDone={() => open()} />
  );
}
