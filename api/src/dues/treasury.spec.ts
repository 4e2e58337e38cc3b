import { startDesk, type Desk } from '../../test/books';
import { invoice, payment } from '../../test/factories/dues.factory';
import type { TreasurySummaryDto } from './dto/treasury.dto';

describe('the newest run of dues', () => {
  let desk: Desk;

  beforeAll(async () => {
    desk = await startDesk();
  });
  beforeEach(() => desk.empty());
  afterAll(() => desk.test.close());

  const raiseOn = async (day: string, description: string, amountMinor = 2400) => {
    desk.test.clock.set(new Date(`${day}T12:00:00Z`));
    return invoice(desk.test, desk.ines, { description, amountMinor, dueOn: day });
  };
  const run = async () =>
    ((await desk.agent.get('/api/treasury/summary').expect(200)).body as TreasurySummaryDto).dues;

  it('is none before dues are raised', async () => {
    expect(await run()).toBeNull();
  });

  it('is counted by its words, whatever quarter of the year it lies across', async () => {
    for (const day of ['2025-09-01', '2025-09-01', '2025-09-02'])
      await raiseOn(day, 'Dues, September to November');
    const paid = await raiseOn('2025-12-01', 'Dues, December to February');
    await raiseOn('2025-12-01', 'Dues, December to February', 1200);
    await raiseOn('2026-01-09', 'Dues, December to February', 800);
    await payment(desk.test, desk.ines, paid, { receivedOn: '2025-12-03' });
    expect(await run()).toEqual({
      description: 'Dues, December to February',
      dueOn: '2026-01-09',
      raisedMinor: 4400,
      paidMinor: 2400,
      count: 3,
      paidCount: 1,
    });
  });

  it('leaves out the same words of a year ago, and a single invoice beside it', async () => {
    await raiseOn('2024-12-01', 'Dues, December to February', 9900);
    await raiseOn('2025-12-01', 'Dues, December to February');
    await raiseOn('2025-12-01', 'Dues, December to February');
    await raiseOn('2026-01-02', 'Dues, joined in the middle', 1600);
    expect(await run()).toMatchObject({ count: 2, raisedMinor: 4800 });
  });
});
