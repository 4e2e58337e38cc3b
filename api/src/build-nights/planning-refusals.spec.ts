import type supertest from 'supertest';
import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { bench, nightPlan } from '../../test/factories/night.factory';
import { person, someoneWith } from '../../test/factories/person.factory';

const WEEKLY = 'FREQ=WEEKLY;BYDAY=TU;COUNT=3';
const ID = '00000000-0000-4000-8000-000000000000';

describe('a plan that cannot be', () => {
  let test: TestApp;
  let mentor: supertest.Agent;

  beforeAll(async () => {
    test = await startTestApp();
    mentor = (await someoneWith(test, 'mentor')).agent;
  });
  afterAll(() => test.close());

  const schedule = (body: object) => mentor.post('/api/build-nights').send(body);
  const nightsInDatabase = async (): Promise<number> => {
    const [row] = await test.dataSource.query<{ count: number }[]>(
      'SELECT count(*)::integer AS count FROM build_night',
    );
    return row?.count ?? 0;
  };

  it.each([
    ['an unknown field', { colour: 'green' }, '#/colour'],
    ['no title', { title: ' ' }, '#/title'],
    ['an overlong title', { title: 'x'.repeat(81) }, '#/title'],
    ['a title with a NUL', { title: 'a\u0000b' }, '#/title'],
    ['an overlong note', { note: 'x'.repeat(1001) }, '#/note'],
    ['no place', { places: 0 }, '#/places'],
    ['a hundred and one places', { places: 101 }, '#/places'],
    ['half a place', { places: 1.5 }, '#/places'],
    ['places as text', { places: '8' }, '#/places'],
    ['places that are no number', { places: Number.NaN }, '#/places'],
    ['a wall time without its offset', { startsAt: '2026-01-20T19:30:00' }, '#/startsAt'],
    ['a day that does not exist', { startsAt: '2026-02-30T19:30:00Z' }, '#/startsAt'],
    ['an offset that does not exist', { startsAt: '2026-01-20T19:30:00+99:99' }, '#/startsAt'],
    [
      'a beginning in the past',
      { startsAt: '2026-01-15T11:59:00Z', endsAt: '2026-01-15T13:00:00Z' },
      '#/startsAt',
    ],
    [
      'a beginning far ahead',
      { startsAt: '2029-01-16T19:30:00Z', endsAt: '2029-01-16T21:30:00Z' },
      '#/startsAt',
    ],
    ['reversed times', { endsAt: '2026-01-20T19:00:00Z' }, '#/endsAt'],
    ['no length', { endsAt: '2026-01-20T19:30:00Z' }, '#/endsAt'],
    ['a night of a minute', { endsAt: '2026-01-20T19:31:00Z' }, '#/endsAt'],
    ['a night of a day', { endsAt: '2026-01-21T19:30:00Z' }, '#/endsAt'],
    ['a rule that is no rule', { repeat: { rule: 'every Tuesday' } }, '#/repeat/rule'],
    ['a rule as a number', { repeat: { rule: 7 } }, '#/repeat/rule'],
    ['a repeat that is no object', { repeat: 'weekly' }, '#/repeat'],
    ['a null repeat', { repeat: null }, '#/repeat'],
    [
      'a rule past sixty nights',
      { repeat: { rule: 'FREQ=WEEKLY;BYDAY=MO,TU;UNTIL=20270120T000000Z' } },
      '#/repeat/rule',
    ],
    ['a rule that ended before', { repeat: { rule: 'FREQ=WEEKLY;UNTIL=20260101T000000Z' } }, '#/repeat/rule'],
    ['a first night on another day', { repeat: { rule: 'FREQ=WEEKLY;BYDAY=WE;COUNT=2' } }, '#/startsAt'],
    ['a day to skip that is no day', { repeat: { rule: WEEKLY }, skip: ['2026-13-01'] }, '#/skip'],
    [
      'every night left out',
      { repeat: { rule: WEEKLY }, skip: ['2026-01-20', '2026-01-27', '2026-02-03'] },
      '#/skip',
    ],
    ['a bench that is none', { benchIds: [ID] }, '#/benchIds'],
    ['a bench twice', { benchIds: [ID, ID] }, '#/benchIds'],
    ['a bench that is no id', { benchIds: ['Bench 1'] }, '#/benchIds'],
    ['a mentor who is nobody', { mentorIds: [ID] }, '#/mentorIds'],
    ['no mentor', { mentorIds: [] }, '#/mentorIds'],
    ['a stage of no plan', { stageIds: [ID] }, '#/stageIds'],
    ['another bench that is none', { instead: [{ date: '2026-01-20', benchIds: [ID] }] }, '#/benchIds'],
    ['an instead without its day', { instead: [{ benchIds: [] }] }, '#/instead/0/date'],
  ])('refuses %s and keeps nothing', async (_what, change, pointer) => {
    const before = await nightsInDatabase();
    const { body } = await schedule({ ...nightPlan(), ...change }).expect(422);
    expect(body).toMatchObject({ type: '/problems/invalid-input', errors: [{ pointer }] });
    expect(await nightsInDatabase()).toBe(before);
  });

  it('refuses a retired bench, an instrument for a bench, and a member for a mentor', async () => {
    const retired = await bench(test, { retiredAt: TEST_NOW });
    const instrument = await bench(test, { kind: 'instrument', tag: 'FR-900' });
    const member = await person(test);
    for (const { id } of [retired, instrument]) {
      const { body } = await schedule(nightPlan({ benchIds: [id] })).expect(422);
      expect(body.errors[0].pointer).toBe('#/benchIds');
    }
    const { body } = await schedule(nightPlan({ mentorIds: [member.id] })).expect(422);
    expect(body.errors[0].pointer).toBe('#/mentorIds');
  });
});
