import { PlansService } from '../src/plans/plans.service';
import { actorWith, published, smallPlan } from './factories/plan.factory';
import { someoneWith } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

describe('plans', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  const planIdOf = async (editionId: string): Promise<string> => {
    const [row] = await test.dataSource.query<{ plan_id: string }[]>(
      'SELECT plan_id FROM plan_edition WHERE id = $1',
      [editionId],
    );
    return row?.plan_id ?? '';
  };

  it('shows everybody a published edition as it was described', async () => {
    const plan = smallPlan();
    const planId = await planIdOf(await published(test, plan));
    const { agent } = await someoneWith(test);
    const { body } = await agent.get(`/api/plans/${planId}/editions/1`).expect(200);
    expect(body).toMatchObject({ planName: plan.name, number: 1, publishedAt: '2026-01-15T12:00:00.000Z' });
    expect((body.stages as { name: string }[]).map(({ name }) => name)).toEqual([
      'Source',
      'Amplifier',
      'On the air',
    ]);
    expect(body.levelPoints).toMatchObject([
      { testPoint: 'TP1', plannedDbm: -19, limitDbm: null },
      { testPoint: 'TP2', plannedDbm: 1.5, limitDbm: 10 },
    ]);
    const [, , gain] = body.stages[1].checks;
    expect(gain).toMatchObject({ method: 'gain', unit: 'dB', windowLow: 19, windowHigh: 22, target: 20.5 });
    expect(gain.fromCheckIds).toEqual([body.stages[1].checks[1].id, body.stages[1].checks[0].id]);
  });

  it('lists plans with their editions', async () => {
    const plan = smallPlan();
    await published(test, plan);
    await published(test, { ...plan, edition: 2 });
    const { agent } = await someoneWith(test);
    const { body } = await agent.get('/api/plans?perPage=200').expect(200);
    const shown = (body.items as { name: string }[]).find(({ name }) => name === plan.name);
    expect(shown).toMatchObject({ editions: [1, 2] });
  });

  it('is for mentors to publish, only with stages that meet, and each edition once', async () => {
    const plans = test.app.get(PlansService);
    const mentor = await actorWith(test, 'mentor');
    const member = await actorWith(test);
    await expect(plans.publish(member, smallPlan())).rejects.toMatchObject({ code: 'not-allowed' });
    const plan = smallPlan({ stages: [{ name: 'Empty', summary: '', checks: [] }] });
    await expect(plans.publish(mentor, plan)).rejects.toMatchObject({
      code: 'plan-does-not-meet',
      extras: { errors: [{ pointer: '#/stages/0' }] },
    });
    const unknown = smallPlan({}, 'A kind nobody has');
    await expect(plans.publish(mentor, unknown)).rejects.toMatchObject({ code: 'plan-does-not-meet' });
    const good = smallPlan();
    await plans.publish(mentor, good);
    await expect(plans.publish(mentor, good)).rejects.toMatchObject({ code: 'edition-published-already' });
  });

  it.each([
    ['an edition it does not have', '/editions/9', 404],
    ['edition 0', '/editions/0', 404],
    ['a number past all integers', '/editions/99999999999999', 404],
    ['words for a number', '/editions/first', 400],
  ])('answers %s without a fault of its own', async (_what, path, status) => {
    const planId = await planIdOf(await published(test));
    const { agent } = await someoneWith(test);
    const response = await agent.get(`/api/plans/${planId}${path}`).expect(status);
    expect(response.headers['content-type']).toMatch(/problem\+json/);
  });

  it('asks who is asking', async () => {
    await test.http().get('/api/plans').expect(401);
    const { agent } = await someoneWith(test);
    await agent.get('/api/plans/not-an-id/editions/1').expect(400);
  });

  describe('a published edition in the database', () => {
    let editionId: string;
    beforeAll(async () => {
      editionId = await published(test);
    });

    it.each([
      ['the edition is unpublished', 'UPDATE plan_edition SET published_at = NULL WHERE id = $1'],
      ['the edition gets another number', 'UPDATE plan_edition SET number = 7 WHERE id = $1'],
      ['the edition is deleted', 'DELETE FROM plan_edition WHERE id = $1'],
      ['a stage is renamed', `UPDATE stage SET name = 'Other' WHERE edition_id = $1`],
      ['a stage is added', `INSERT INTO stage (edition_id, position, name) VALUES ($1, 99, 'New')`],
      ['a stage is deleted', 'DELETE FROM stage WHERE edition_id = $1'],
      [
        'a level is moved',
        'UPDATE level_point SET planned_dbm = 0 WHERE stage_id IN (SELECT id FROM stage WHERE edition_id = $1)',
      ],
      [
        'a window is widened',
        'UPDATE plan_check SET window_low = -99 WHERE stage_id IN (SELECT id FROM stage WHERE edition_id = $1)',
      ],
      [
        'a check is added',
        `INSERT INTO plan_check (stage_id, position, kind, title)
         SELECT id, 99, 'tick', 'New' FROM stage WHERE edition_id = $1`,
      ],
      [
        'a check is deleted',
        'DELETE FROM plan_check WHERE stage_id IN (SELECT id FROM stage WHERE edition_id = $1)',
      ],
    ])('stays as it is when %s', async (_what, sql) => {
      await expect(test.dataSource.query(sql, [editionId])).rejects.toMatchObject({
        driverError: { constraint: expect.stringMatching(/_published_is_fixed$/) as string },
      });
    });

    it('can be written to until it is published', async () => {
      const draft = `INSERT INTO plan_edition (plan_id, number) SELECT plan_id, 50 FROM plan_edition WHERE id = $1 RETURNING id`;
      const [row] = await test.dataSource.query<{ id: string }[]>(draft, [editionId]);
      const addStage = `INSERT INTO stage (edition_id, position, name) VALUES ($1, 1, 'New')`;
      await expect(test.dataSource.query(addStage, [row?.id])).resolves.toBeDefined();
    });
  });
});
