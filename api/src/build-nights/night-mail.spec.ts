import type supertest from 'supertest';
import { appOn, startTestApp, type TestApp } from '../../test/app';
import { joined, startedBuild } from '../../test/factories/build.factory';
import { night, nightPlan } from '../../test/factories/night.factory';
import { someoneWith } from '../../test/factories/person.factory';
import { startMailCatcher, type MailCatcher } from '../../test/mail-catcher';
import { MailCarrier } from '../mail/mail-carrier';

describe('the mail of build nights', () => {
  let catcher: MailCatcher;
  let test: TestApp;
  let second: TestApp;
  let mentor: supertest.Agent;

  beforeAll(async () => {
    catcher = await startMailCatcher();
    test = await startTestApp({ SMTP_URL: catcher.smtpUrl });
    second = await appOn(test.environment.DATABASE_URL, { SMTP_URL: catcher.smtpUrl });
    mentor = (await someoneWith(test, 'mentor')).agent;
  });
  afterAll(async () => {
    await second.close();
    await test.close();
    await catcher.stop();
  });

  /** Two processes at the same outbox, as in the running product. */
  const carry = async (): Promise<void> => {
    await Promise.all([test, second].map(({ app }) => app.get(MailCarrier).carryAll()));
  };

  it('reaches, once for a whole series, those whose build is on a stage in focus, and nobody else', async () => {
    const first = await startedBuild(test);
    const { planId, stages, currentStageId } = first.build;
    const other = await joined(test, planId);
    const elsewhere = await startedBuild(test);
    const { body: preview } = await mentor
      .post('/api/build-nights/preview')
      .send(nightPlan({ stageIds: [currentStageId ?? ''] }))
      .expect(200);
    expect(preview.toTell).toBe(2);
    const plan = nightPlan({
      title: 'Larkmoor Twenty',
      repeat: { rule: 'FREQ=WEEKLY;COUNT=3' },
      stageIds: [currentStageId ?? ''],
      tellByMail: true,
    });
    const { body } = await mentor.post('/api/build-nights').send(plan).expect(201);
    expect(body.told).toBe(2);
    await carry();
    const focus = stages.find(({ id }) => id === currentStageId);
    for (const { builder } of [first, other]) {
      const letters = await catcher.mailTo(builder.email);
      expect(letters.map(({ subject }) => subject)).toEqual(['3 new build nights: Larkmoor Twenty']);
      expect(letters[0]?.text).toContain('Tue 20 Jan, 19:30 to 21:30');
      expect(letters[0]?.text).toContain('Tue 3 Feb, 19:30 to 21:30');
      expect(letters[0]?.text).toContain(`${focus?.position} ${focus?.name}`);
    }
    expect(await catcher.mailTo(elsewhere.builder.email)).toEqual([]);
  });

  it('is not written when the mentor does not ask for it', async () => {
    const { builder, build } = await startedBuild(test);
    const { agent } = await someoneWith(test, 'mentor');
    const plan = nightPlan({ stageIds: [build.currentStageId ?? ''] });
    const { body } = await agent.post('/api/build-nights').send(plan).expect(201);
    expect(body.told).toBe(0);
    await carry();
    expect(await catcher.mailTo(builder.email)).toEqual([]);
  });

  it('tells of a place from the waiting list and of a cancellation', async () => {
    const { agent } = await someoneWith(test, 'mentor');
    const made = await night(agent, { places: 1 });
    const [coming, waiting] = [await someoneWith(test), await someoneWith(test)];
    for (const guest of [coming, waiting])
      await guest.agent.post(`/api/build-nights/${made.id}/coming`).expect(200);
    await coming.agent.delete(`/api/build-nights/${made.id}/coming`).expect(200);
    await agent.post(`/api/build-nights/${made.id}/cancel`).send({ reason: 'No heating.' }).expect(200);
    await carry();
    const subjects = async (email: string) =>
      (await catcher.mailTo(email)).map(({ subject }) => subject).sort();
    expect(await subjects(waiting.person.email)).toEqual([
      'Cancelled: Winding evening',
      'You have a place: Winding evening',
    ]);
    expect(await subjects(coming.person.email)).toEqual([]);
  });
});
