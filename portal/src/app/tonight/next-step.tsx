import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { Link } from 'react-router-dom';
import { formatInClubZone } from '../../lib/club-time-text';
import { useMyBuilds, type Build, type BuildCheck, type Reading } from '../../features/builds/api/builds';
import { checkPath, findStage, nextCheck, readingInForce } from '../../features/builds/logic/stage';
import { readingWords, windowText } from '../../features/builds/logic/words';
import { EmptyState } from '../../shared-ui/empty-state';
import { Icon } from '../../shared-ui/icon';
import { LoadingBars } from '../../shared-ui/loading-bars';
import { ProblemAlert } from '../../shared-ui/problem-alert';
import { VerdictChip } from '../../shared-ui/states/verdict-chip';
import { usePhone } from '../../shared-ui/use-phone';
import { WindowBar } from '../../shared-ui/window-bar';

/** What to do next, where, and with what: the one open thing on the page. */
export function NextStep({ bench }: { bench?: string }) {
  const builds = useMyBuilds();
  if (builds.isPending) return <LoadingBars rows={4} label="Looking for your next step" />;
  if (builds.isError) return <ProblemAlert error={builds.error} onRetry={() => void builds.refetch()} />;
  const [build] = builds.data;
  if (!build)
    return (
      <EmptyState
        title="You have no build yet"
        action={
          <Button variant="contained" component={Link} to="/build">
            Choose a plan
          </Button>
        }
      >
        Begin stage 1 when you are ready; a mentor sees what you send.
      </EmptyState>
    );
  return <Step build={build} bench={bench} />;
}

function wordsOf(build: Build): { title: string; act: string; path: string; where: string } {
  const stage = findStage(build, build.currentStageId);
  if (!stage) return { title: 'Your build', act: 'Open the build', path: '/build', where: '' };
  const { position, name, checks } = stage;
  const check = nextCheck(stage);
  const where = `stage ${position} ${name}`;
  if (stage.state === 'with mentor' || stage.state === 'locked' || !check) {
    const done = stage.state === 'signed off';
    const title = done
      ? 'Every stage is signed off'
      : stage.missingToSend === 0 && !check && stage.state !== 'with mentor'
        ? 'Send it to a mentor'
        : 'It is with a mentor';
    return { title, act: 'Open the stage', path: checkPath(build.id, stage.id), where };
  }
  const isRetake = check.readings.length > 0;
  const thing = check.title.charAt(0).toLowerCase() + check.title.slice(1);
  const title = isRetake ? `Settle the ${thing}` : check.title;
  const act = check.kind === 'measure' ? 'Open the reading' : 'Open the check';
  const path = checkPath(build.id, stage.id, check.id);
  return { title, act, path, where: `${where}, check ${check.position} of ${checks.length}` };
}

function Step({ build, bench }: { build: Build; bench?: string }) {
  const { title, act, path, where } = wordsOf(build);
  const stage = findStage(build, build.currentStageId);
  const check = stage && stage.state !== 'with mentor' ? nextCheck(stage) : undefined;
  const isMeasured = check?.kind === 'measure';
  const isPhone = usePhone();
  return (
    <Box
      component="section"
      aria-label="Next"
      sx={{
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
        p: { xs: '14px 16px 16px', md: '18px 20px' },
      }}
    >
      <Box
        sx={{
          display: 'flex',
          flexWrap: 'wrap',
          justifyContent: 'space-between',
          alignItems: 'center',
          gap: '12px',
        }}
      >
        <div>
          <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
            {bench ? `Next at ${bench}, ${where}` : `Next, ${where}`}
          </Typography>
          <Typography
            variant="h2"
            sx={{
              fontSize: { xs: '1.125rem', md: '1.375rem' },
              lineHeight: { xs: '1.5rem', md: '1.9375rem' },
            }}
          >
            {title}
          </Typography>
          {isPhone && isMeasured && <ShortReading check={check} />}
        </div>
        <Button
          variant="contained"
          component={Link}
          to={path}
          endIcon={<Icon name="arrow" />}
          sx={{ width: { xs: '100%', sm: 'auto' } }}
        >
          {act}
        </Button>
      </Box>
      {!isPhone && isMeasured && <LastReading check={check} />}
    </Box>
  );
}

/** A phone's one line: the window, and the last reading beside it. */
function ShortReading({ check }: { check: BuildCheck }) {
  const reading = readingInForce(check);
  const words = reading && readingWords(reading, 2);
  return (
    <Typography variant="small" component="p" sx={{ m: '2px 0 0' }}>
      Window <b>{windowText(check)}</b>,{' '}
      {words ? (
        <>
          last reading{' '}
          <b>
            {words.value} {words.plusMinus}
          </b>
        </>
      ) : (
        'no reading yet'
      )}
    </Typography>
  );
}

function LastReading({ check }: { check: BuildCheck }) {
  const reading = readingInForce(check);
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        gap: '10px 24px',
        mt: '14px',
        pt: '12px',
        borderTop: '1px solid',
        borderColor: 'token.rule',
      }}
    >
      {reading ? (
        <>
          <div>
            <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
              Last reading, {formatInClubZone(reading.takenAt)}
            </Typography>
            <ReadingFigures reading={reading} />
          </div>
          <VerdictChip verdict={reading.verdict} />
        </>
      ) : (
        <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
          Window <b>{windowText(check)}</b>, no reading yet
        </Typography>
      )}
      {check.unit !== 'Hz' && (
        <Box sx={{ flex: '1 1 220px', maxWidth: 330, ml: 'auto' }}>
          <WindowBar
            low={check.windowLow ?? undefined}
            high={check.windowHigh ?? undefined}
            target={check.target ?? undefined}
            reading={reading}
            tone={reading?.verdict === 'pass' ? 'green' : 'copper'}
            unit={check.unit ?? ''}
          />
        </Box>
      )}
    </Box>
  );
}

/** The value large, its uncertainty small beside it. */
function ReadingFigures({ reading }: { reading: Reading }) {
  const { value, plusMinus, unit } = readingWords(reading, 2);
  return (
    <Box component="span" sx={{ fontWeight: 700, fontSize: '1.1875rem', lineHeight: '1.5rem' }}>
      {value}{' '}
      <Typography variant="small" component="span" sx={{ color: 'token.ink2' }}>
        {unit === 'MHz' ? `MHz ${plusMinus}` : `${plusMinus} ${unit}`}
      </Typography>
    </Box>
  );
}
