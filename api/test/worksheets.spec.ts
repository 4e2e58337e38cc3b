import { startTestApp, type TestApp } from './app';
import { startedBuild, type StartedBuild } from './factories/build.factory';
import { someoneWith } from './factories/person.factory';

const NOBODY = '5f0e0000-0000-4000-8000-000000000000';
const SHEET = {
  family: 'pads',
  inputs: 'kind=pi&attenuationDb=3',
  result: 'Pi pad, 3 dB\n300, 18, 300 ohm',
};

describe('worksheets', () => {
  let test: TestApp;
  let started: StartedBuild;

  beforeAll(async () => {
    test = await startTestApp();
    started = await startedBuild(test);
  });
  afterAll(() => test.close());

  const at = (): string => started.stageAt('Source', 'worksheets');

  it('are put on a stage by its builder, read by mentors, and leave the page when taken back', async () => {
    const { body } = await started.agent.post(at()).send(SHEET).expect(201);
    expect(body).toMatchObject({ ...SHEET, stageId: started.stage('Source').id });
    const { agent: mentor } = await someoneWith(test, 'mentor');
    const listed = await mentor.get(started.at('/worksheets')).expect(200);
    expect(listed.body).toMatchObject([SHEET]);
    await started.agent.delete(started.at(`/worksheets/${body.id}`)).expect(204);
    await started.agent.delete(started.at(`/worksheets/${body.id}`)).expect(404);
    expect((await started.agent.get(started.at('/worksheets')).expect(200)).body).toEqual([]);
  });

  it('are not there for another member, and not for a mentor to write', async () => {
    const { agent: other } = await someoneWith(test);
    const { agent: mentor } = await someoneWith(test, 'mentor');
    await other.get(started.at('/worksheets')).expect(404);
    await other.post(at()).send(SHEET).expect(404);
    await mentor.post(at()).send(SHEET).expect(403);
    await mentor.delete(started.at(`/worksheets/${NOBODY}`)).expect(403);
  });

  it.each([
    [{ ...SHEET, family: 'soup' }, '#/family'],
    [{ ...SHEET, inputs: 'a b' }, '#/inputs'],
    [{ ...SHEET, inputs: 'x'.repeat(4001) }, '#/inputs'],
    [{ ...SHEET, result: '  ' }, '#/result'],
    [{ ...SHEET, result: 'x'.repeat(4001) }, '#/result'],
    [{ ...SHEET, verdict: 'pass' }, '#/verdict'],
  ])('name the field at fault: %#', async (body, pointer) => {
    const response = await started.agent.post(at()).send(body).expect(422);
    expect(response.body.errors).toEqual([expect.objectContaining({ pointer })]);
  });

  it('are twelve on a stage at most, however many come at once, and one taken back makes room', async () => {
    const full = await startedBuild(test);
    const put = () => full.agent.post(full.stageAt('Source', 'worksheets')).send(SHEET);
    const statuses = (await Promise.all(Array.from({ length: 16 }, put))).map(({ status }) => status);
    expect(statuses.filter((status) => status === 201)).toHaveLength(12);
    expect(statuses.filter((status) => status === 409)).toHaveLength(4);
    const [first] = (await full.agent.get(full.at('/worksheets'))).body;
    const refused = await put().expect(409);
    expect(refused.body.type).toMatch(/worksheets-enough$/);
    await full.agent.delete(full.at(`/worksheets/${first.id}`)).expect(204);
    await put().expect(201);
  });

  it('stand on a stage of that build only', async () => {
    await started.agent
      .post(started.at(`/stages/${NOBODY}/worksheets`))
      .send(SHEET)
      .expect(404);
  });
});

describe('the rules the club goes by', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  it('are chosen by an organiser, and everybody is told which', async () => {
    const { agent: organiser } = await someoneWith(test, 'organiser');
    const { agent: mentor } = await someoneWith(test, 'mentor');
    await mentor.put('/api/club/rules').send({ ruleSet: 'US-97' }).expect(403);
    await organiser.put('/api/club/rules').send({ ruleSet: 'US-98' }).expect(422);
    await organiser.put('/api/club/rules').send({ ruleSet: 'US-97' }).expect(204);
    expect((await mentor.get('/api/club').expect(200)).body).toMatchObject({ ruleSet: 'US-97' });
  });
});
