import type supertest from 'supertest';
import type { BuildCheckDto, BuildStageDto } from '../../src/builds/dto/build-stage.dto';
import type { BuildDto } from '../../src/builds/dto/build.dto';
import type { Person } from '../../src/people/person.entity';
import type { PlanDescription } from '../../src/plans/plan-description';
import type { TestApp } from '../app';
import { someoneWith } from './person.factory';
import { published, smallPlan } from './plan.factory';

/** 71 mV peak to peak across 50 ohm: −19.0 dBm. */
export const SOURCE_ENTRY = {
  voltsPerDivision: '2m',
  divisionsPeakToPeak: '3.55',
  readToDivisions: '0.05',
  probeRatio: '10',
  loadOhms: '50',
};

/** 0.75 V peak to peak across 50 ohm: +1.48 dBm. */
const OUTPUT_ENTRY = { ...SOURCE_ENTRY, voltsPerDivision: '10 mV', divisionsPeakToPeak: '7.5' };

/** The first bytes of a PNG, and something after them. */
export const PNG = Buffer.concat([
  Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
  Buffer.from('a small picture'),
]);

export interface StartedBuild {
  builder: Person;
  agent: supertest.Agent;
  build: BuildDto;
  /** Stages and checks by title, which the small plan has once each. */
  stage: (name: string) => BuildStageDto;
  check: (title: string) => BuildCheckDto;
  /** Addresses under this build. */
  at: (path: string) => string;
  checkAt: (title: string, what: string) => string;
  stageAt: (name: string, what: string) => string;
  /** As it is now. */
  now: () => Promise<BuildDto>;
}

/** Somebody who has just begun a build to a plan of their own. */
export async function startedBuild(
  test: TestApp,
  plan: PlanDescription = smallPlan(),
): Promise<StartedBuild> {
  const editionId = await published(test, plan);
  const [row] = await test.dataSource.query<{ plan_id: string }[]>(
    'SELECT plan_id FROM plan_edition WHERE id = $1',
    [editionId],
  );
  return joined(test, row?.plan_id ?? '');
}

/** Somebody else who begins a build to the same plan. */
export async function joined(test: TestApp, planId: string): Promise<StartedBuild> {
  const { person: builder, agent } = await someoneWith(test);
  const response = await agent.post('/api/builds').send({ planId }).expect(201);
  const build = response.body as BuildDto;
  const stage = (name: string) =>
    found(
      build.stages.find((one) => one.name === name),
      name,
    );
  const check = (title: string) =>
    found(
      build.stages.flatMap(({ checks }) => checks).find((one) => one.title === title),
      title,
    );
  const at = (path: string) => `/api/builds/${build.id}${path}`;
  return {
    ...{ builder, agent, build, stage, check, at },
    checkAt: (title, what) => at(`/checks/${check(title).id}/${what}`),
    stageAt: (name, what) => at(`/stages/${stage(name).id}/${what}`),
    now: async () => (await agent.get(at('')).expect(200)).body as BuildDto,
  };
}

function found<T>(value: T | undefined, name: string): T {
  if (value === undefined) throw new Error(`The build has no ${name}.`);
  return value;
}

/** Does all that the builder has to do on the first stage. */
export async function settleSource({ agent, checkAt }: StartedBuild): Promise<void> {
  await agent.post(checkAt('Board cleaned', 'marks')).expect(201);
  const reading = { method: 'oscilloscope', entry: SOURCE_ENTRY };
  await agent.post(checkAt('Output level at TP1', 'readings')).send(reading).expect(201);
  await agent.post(checkAt('Photo of the board', 'photos')).attach('photo', PNG, 'board.png').expect(201);
}

/** The first stage settled and sent. */
export async function sendSource(started: StartedBuild): Promise<void> {
  await settleSource(started);
  await started.agent.post(started.stageAt('Source', 'submit')).send({ note: 'Here it is.' }).expect(200);
}

/** The first stage seen and signed off by a new mentor. */
export async function signOffSource(test: TestApp, started: StartedBuild): Promise<supertest.Agent> {
  const { agent: mentor } = await someoneWith(test, 'mentor');
  await mentor.post(started.checkAt('Looked at the joints', 'marks')).expect(201);
  await mentor.post(started.stageAt('Source', 'sign-off')).send({ note: 'Nice.' }).expect(200);
  return mentor;
}

/** All that the builder has to do on the second stage. */
export async function settleAmplifier({ agent, checkAt }: StartedBuild): Promise<void> {
  const reading = { method: 'oscilloscope', entry: OUTPUT_ENTRY };
  await agent.post(checkAt('Output level at TP2', 'readings')).send(reading).expect(201);
  await agent.post(checkAt('The load was fitted', 'marks')).expect(201);
}
