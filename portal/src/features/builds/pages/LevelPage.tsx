import { useNavigate, useParams } from 'react-router-dom';
import { LevelDiagram } from '../../../shared-ui/level-diagram/level-diagram';
import { LevelDiagramPhone } from '../../../shared-ui/level-diagram/level-diagram-phone';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { PhoneBar } from '../../../shared-ui/phone-bar';
import { usePhone } from '../../../shared-ui/use-phone';
import { useBuild, type Build } from '../api/builds';
import { BuildProblem } from '../components/no-such-build';
import { checkPath, levelPointsOf } from '../logic/stage';
import { useLevelOnDevice } from '../logic/use-level-on-device';
import { serialText } from '../logic/words';

/** The level diagram as a page of its own, which is how a phone shows it. */
export default function LevelPage() {
  const { buildId = '' } = useParams();
  const build = useBuild(buildId);
  if (build.isPending) return <LoadingBars rows={8} label="Opening the level diagram" />;
  if (build.isError) return <BuildProblem error={build.error} onRetry={() => void build.refetch()} />;
  return <Levels build={build.data} />;
}

function Levels({ build }: { build: Build }) {
  const navigate = useNavigate();
  const isPhone = usePhone();
  const points = levelPointsOf(build);
  const current = build.levelPoints.filter(({ stageId }) => stageId === build.currentStageId).at(-1);
  const typed = useLevelOnDevice(build);
  const backTo = typed?.stageId ?? build.currentStageId;
  const back = backTo ? checkPath(build.id, backTo, typed?.checkId) : '/build';
  const entered = typed?.entered;
  const currentId = entered?.pointId ?? current?.id;
  const open = (pointId: string) => {
    const stageId = build.levelPoints.find(({ id }) => id === pointId)?.stageId;
    if (stageId)
      void navigate(checkPath(build.id, stageId, pointId === entered?.pointId ? typed?.checkId : undefined));
  };
  const name = `${build.planName}, ${serialText(build.serial)}`;
  if (isPhone)
    return (
      <>
        <PhoneBar
          title="Level diagram"
          subtitle={name}
          backTo={back}
          backLabel="Back to the stage"
          end="dBm"
        />
        <LevelDiagramPhone points={points} entered={entered} currentId={currentId} onOpen={open} />
      </>
    );
  return (
    <>
      <PageTitle tab="Level diagram" over={name}>
        Level <b>diagram</b>
      </PageTitle>
      <LevelDiagram points={points} entered={entered} currentId={currentId} onOpen={open} />
    </>
  );
}
