import { GroupsService } from '../src/groups/groups.service';
import { person, signedInAs, someoneWith } from './factories/person.factory';
import { startTestApp, type TestApp } from './app';

describe('groups', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(() => test.close());

  it('are listed with their members by name, and one’s own apart', async () => {
    const [tamsin, bea] = [await person(test, { name: 'Tamsin' }), await person(test, { name: 'Bea' })];
    const groups = test.app.get(GroupsService);
    await groups.form({ name: 'Tuesdays', about: 'Bench 1 and 2', memberIds: [tamsin.id, bea.id] });
    await groups.form({ name: 'Saturdays', about: '', memberIds: [bea.id] });
    const agent = await signedInAs(test, tamsin);
    const { body } = await agent.get('/api/groups').expect(200);
    expect(body).toMatchObject({ total: 2 });
    expect(body.items).toMatchObject([
      { name: 'Saturdays', mine: false, members: [{ name: 'Bea' }] },
      {
        name: 'Tuesdays',
        mine: true,
        about: 'Bench 1 and 2',
        members: [{ name: 'Bea' }, { name: 'Tamsin' }],
      },
    ]);
    const mine = await agent.get('/api/groups/mine').expect(200);
    expect(mine.body).toMatchObject([{ name: 'Tuesdays' }]);
  });

  it('are none for somebody who is in none', async () => {
    const { agent } = await someoneWith(test);
    expect((await agent.get('/api/groups/mine').expect(200)).body).toEqual([]);
  });

  it('are for people who are signed in', async () => {
    await test.http().get('/api/groups').expect(401);
    await test.http().get('/api/groups/mine').expect(401);
  });
});
