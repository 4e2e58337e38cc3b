import { startMailCatcher, type MailCatcher } from '../../test/mail-catcher';
import { startTestApp, TEST_NOW, type TestApp } from '../../test/app';
import { MailCarrier } from './mail-carrier';
import { MailService, type Letter } from './mail.service';

const MINUTE = 60_000;

describe('mail', () => {
  let catcher: MailCatcher;
  let test: TestApp;
  let second: TestApp;

  beforeAll(async () => {
    catcher = await startMailCatcher();
    test = await startTestApp({ SMTP_URL: catcher.smtpUrl });
    // Another process of the same club: its own pool, the same database.
    const { DATABASE_URL } = test.environment;
    second = await startTestApp({ SMTP_URL: catcher.smtpUrl, DATABASE_URL });
  });
  beforeEach(() => {
    test.clock.set(TEST_NOW);
    second.clock.set(TEST_NOW);
  });
  afterAll(async () => {
    await second.close();
    await test.close();
    await catcher.stop();
  });

  const queue = (letters: Letter[]): Promise<void> =>
    test.dataSource.transaction((manager) => test.app.get(MailService).queue(manager, letters));
  const carry = (app: TestApp): Promise<void> => app.app.get(MailCarrier).carryAll();
  const outbox = (to: string): Promise<{ tries: number; sent: boolean; given_up: boolean; due_at: Date }[]> =>
    test.dataSource.query(
      `SELECT tries, sent_at IS NOT NULL AS sent, given_up_at IS NOT NULL AS given_up, due_at
       FROM mail WHERE "to" = $1`,
      [to],
    );

  it('arrives by SMTP with its subject, its words in UTF-8 and the club’s name under it', async () => {
    await queue([
      { to: 'tamsin@larkmoor.example', subject: 'Köln − 50 Ω', text: 'Thu 22 Oct, 19:00 − 22:00' },
    ]);
    await carry(test);
    expect(await catcher.mailTo('tamsin@larkmoor.example')).toMatchObject([
      {
        from: 'portal@ferrite-row.example',
        to: ['tamsin@larkmoor.example'],
        subject: 'Köln − 50 Ω',
        text: expect.stringMatching(/^Thu 22 Oct, 19:00 − 22:00\s+The club\s*$/) as string,
      },
    ]);
  });

  it('is sent once each, whatever the number of processes that carry it', async () => {
    const addresses = Array.from({ length: 40 }, (_, index) => `member-${index}@larkmoor.example`);
    await queue(addresses.map((to) => ({ to, subject: 'One of forty', text: 'Once.' })));
    await Promise.all([carry(test), carry(second), carry(test), carry(second)]);
    const arrived = (await catcher.all()).filter(({ subject }) => subject === 'One of forty');
    expect(arrived.map(({ to }) => to[0]).sort()).toEqual([...addresses].sort());
  });

  it('is not sent when the act it tells of was taken back', async () => {
    const taken = test.dataSource.transaction(async (manager) => {
      const letter = { to: 'nobody@larkmoor.example', subject: 'Never', text: 'It did not happen.' };
      await test.app.get(MailService).queue(manager, [letter]);
      throw new Error('taken back');
    });
    await expect(taken).rejects.toThrow('taken back');
    await carry(test);
    expect(await catcher.mailTo('nobody@larkmoor.example')).toEqual([]);
  });

  it('goes to the one address that was meant, and a line break makes no header', async () => {
    const to = 'one@larkmoor.example, two@larkmoor.example';
    await queue([{ to: 'three@larkmoor.example', subject: 'a\r\nBcc: four@larkmoor.example', text: 'x' }]);
    await queue([{ to, subject: 'Two in one', text: 'x' }]);
    await carry(test);
    expect(await catcher.mailTo('two@larkmoor.example')).toEqual([]);
    expect(await catcher.mailTo('four@larkmoor.example')).toEqual([]);
    const [letter] = await catcher.mailTo('three@larkmoor.example');
    expect(letter?.subject).toBe('a Bcc: four@larkmoor.example');
    await test.dataSource.query(`DELETE FROM mail WHERE "to" = $1`, [to]);
  });

  it('is given up at once when the server refuses it for good', async () => {
    const to = 'heavy@larkmoor.example';
    await queue([{ to, subject: 'Heavy', text: 'x'.repeat(11 * 1024 * 1024) }]);
    await carry(test);
    expect(await outbox(to)).toMatchObject([{ tries: 1, sent: false, given_up: true }]);
    await test.dataSource.query(`DELETE FROM mail WHERE "to" = $1`, [to]);
  });

  it('waits while the server is away, longer each time, and arrives when it is back', async () => {
    const to = 'later@larkmoor.example';
    const silent = await startTestApp({ DATABASE_URL: test.environment.DATABASE_URL });
    await queue([{ to, subject: 'Later', text: 'x' }]);
    await carry(silent);
    expect(await outbox(to)).toMatchObject([
      { tries: 1, sent: false, due_at: new Date(TEST_NOW.getTime() + MINUTE) },
    ]);
    await carry(test);
    expect(await catcher.mailTo(to)).toEqual([]);
    silent.clock.advance(MINUTE);
    await carry(silent);
    expect(await outbox(to)).toMatchObject([{ tries: 2, due_at: new Date(TEST_NOW.getTime() + 6 * MINUTE) }]);
    test.clock.advance(6 * MINUTE);
    await carry(test);
    expect(await catcher.mailTo(to)).toHaveLength(1);
    expect(await outbox(to)).toMatchObject([{ tries: 3, sent: true, given_up: false }]);
    await silent.close();
  });
});
