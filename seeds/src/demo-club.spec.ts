import { SettableClock } from '@ferrite-row/api/common/clock';
import { openContext, type ServiceContext } from '@ferrite-row/api/context';
import { testEnvironment } from '../../api/test/app';
import { createDatabase } from '../../api/test/database';
import { seedDemoClub, type Counts } from './demo-club';
import { LARKMOOR_TWENTY } from './plan/larkmoor-twenty';
import { stateOfClub } from './state';

/** How the plan's checks are read. */
const METHODS_OF_THE_PLAN = LARKMOOR_TWENTY.stages
  .flatMap(({ checks }) => checks.flatMap(({ measure }) => measure?.method ?? []))
  .filter((method) => method !== 'gain' && method !== 'carried');

/** The Wednesday before the clocks go back, and a Thursday evening in the middle of a night. */
const MOMENTS = ['2026-10-21T11:00:00Z', '2027-02-04T20:30:00Z'] as const;

interface Laid {
  context: ServiceContext;
  counts: Counts;
  end: () => Promise<void>;
}

async function lay(moment: string): Promise<Laid> {
  const database = await createDatabase();
  Object.assign(process.env, testEnvironment(database.url));
  const clock = new SettableClock(new Date(moment));
  const context = await openContext(clock);
  const counts = await seedDemoClub(context, clock);
  const end = async (): Promise<void> => {
    await context.close();
    await database.drop();
  };
  return { context, counts, end };
}

describe('the demo club', () => {
  const laid: Laid[] = [];
  const ask = <T>(index: number, sql: string): Promise<T[]> => {
    const one = laid[index];
    if (!one) throw new Error('It was not laid.');
    return one.context.database.query<T[]>(sql);
  };

  beforeAll(async () => {
    for (const moment of MOMENTS) laid.push(await lay(moment));
  }, 240_000);
  afterAll(async () => {
    for (const { end } of laid) await end();
  });

  it('has people in every role, benches, instruments, a course, builds, readings, bookings and dues', () => {
    expect(laid[0]?.counts).toMatchObject({ people: 28, nights: 28, builds: 15, groups: 3, statements: 9 });
    expect(laid[0]?.counts.readings).toBeGreaterThan(200);
  });

  it('has an evening on or next, whenever it is laid', async () => {
    for (const [index, moment] of MOMENTS.entries()) {
      const [next] = await ask<{ starts_at: Date; ends_at: Date }>(
        index,
        `SELECT starts_at, ends_at FROM build_night WHERE cancelled_at IS NULL AND ends_at > '${moment}' ORDER BY starts_at LIMIT 1`,
      );
      expect(next?.starts_at.getTime()).toBeLessThan(new Date(moment).getTime() + 7 * 86_400_000);
    }
  });

  it('keeps the course at seven on the wall on both sides of the change of clocks', async () => {
    const times = await ask<{ wall: string }>(
      0,
      `SELECT DISTINCT to_char(starts_at AT TIME ZONE 'Europe/London', 'HH24:MI') AS wall FROM build_night WHERE title = 'Larkmoor Twenty'`,
    );
    expect(times).toEqual([{ wall: '19:00' }]);
  });

  it('has one instrument due for calibration within a week and one in repair', async () => {
    const due = await ask(
      0,
      `SELECT 1 FROM instrument WHERE calibration_due_on - date '2026-10-21' BETWEEN 0 AND 7`,
    );
    const inRepair = await ask(0, `SELECT 1 FROM instrument WHERE condition = 'in repair'`);
    expect([due.length, inRepair.length]).toEqual([1, 1]);
  });

  it('has every booking and every night while the workshop is open', async () => {
    const outside = `SELECT starts_at FROM booking WHERE NOT EXISTS (
      SELECT 1 FROM opening_hours,
        LATERAL (SELECT starts_at AT TIME ZONE 'Europe/London' AS from_wall, ends_at AT TIME ZONE 'Europe/London' AS to_wall) AS wall
      WHERE weekday = extract(isodow FROM from_wall)
        AND from_wall >= date_trunc('day', from_wall) + make_interval(mins => opens_minute)
        AND to_wall <= date_trunc('day', from_wall) + make_interval(mins => closes_minute))`;
    expect(await ask(0, 'SELECT weekday FROM opening_hours')).toHaveLength(6);
    expect([await ask(0, outside), await ask(1, outside)]).toEqual([[], []]);
  });

  it('has builds on every stage', async () => {
    const stages = await ask<{ position: number }>(
      0,
      `SELECT DISTINCT stage.position FROM build_stage JOIN stage ON stage.id = build_stage.stage_id
       WHERE build_stage.state <> 'not started' ORDER BY position`,
    );
    expect(stages.map(({ position }) => position)).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12]);
  });

  it('keeps books that balance', async () => {
    const sums = await ask<{ sum: string }>(0, `SELECT sum(amount_minor)::text AS sum FROM posting`);
    expect(sums).toEqual([{ sum: '0' }]);
  });

  it('writes the same readings whenever it is laid', async () => {
    const typed = `SELECT check_title, entry::text FROM
      (SELECT plan_check.title AS check_title, entry, stage.position, plan_check.position AS place, build.serial, reading.kept_at
       FROM reading JOIN plan_check ON plan_check.id = reading.check_id JOIN stage ON stage.id = plan_check.stage_id
       JOIN build ON build.id = reading.build_id) AS all_of_them ORDER BY serial, position, place, kept_at`;
    expect(await ask(1, typed)).toEqual(await ask(0, typed));
  });

  it('has first tries of every way of reading, most of them good, some too close to call, some not yet', async () => {
    const first = await ask<{ method: string; verdict: string }>(
      0,
      `SELECT DISTINCT ON (build_id, check_id) method, verdict FROM reading
       WHERE method NOT IN ('gain', 'carried') ORDER BY build_id, check_id, kept_at`,
    );
    const share = (verdict: string) => first.filter((one) => one.verdict === verdict).length / first.length;
    expect(new Set(first.map(({ method }) => method))).toEqual(new Set(METHODS_OF_THE_PLAN));
    expect(share('pass')).toBeGreaterThan(0.8);
    expect(share('too close to call')).toBeGreaterThan(0);
    expect(share('not yet')).toBeGreaterThan(0);
  });

  it('sends none of the letters of its past', async () => {
    expect(await ask(0, `SELECT 1 FROM mail WHERE sent_at IS NULL`)).toEqual([]);
  });

  it('takes a laid club for inhabited, so that nothing is written twice', async () => {
    const [first] = laid;
    expect(first && (await stateOfClub(first.context.database))).toBe('inhabited');
  });
});
