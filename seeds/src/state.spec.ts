import { createDatabase, openDatabase } from '../../api/test/database';
import { beginSeeding, endSeeding, stateOfClub, wipe } from './state';

describe('whether to seed', () => {
  let database: Awaited<ReturnType<typeof openDatabase>>;
  let drop: () => Promise<void>;

  beforeEach(async () => {
    const made = await createDatabase();
    drop = made.drop;
    database = await openDatabase(made.url);
  });
  afterEach(async () => {
    await database.destroy();
    await drop();
  });

  const enrol = (email: string) =>
    database.query(`INSERT INTO person (email, name) VALUES ($1, 'Some One')`, [email]);

  it('an empty database is seeded', async () => {
    expect(await stateOfClub(database)).toBe('empty');
  });

  it('a seeded club stays, whatever its organiser writes into its settings', async () => {
    await beginSeeding(database);
    await enrol('member@larkmoor.example');
    await endSeeding(database);
    await database.query(`UPDATE club SET contact_email = 'new@larkmoor.example', name = 'Another'`);
    expect(await stateOfClub(database)).toBe('inhabited');
  });

  it('a seeding that was cut short is thrown away and begun again', async () => {
    await beginSeeding(database);
    await enrol('member@larkmoor.example');
    expect(await stateOfClub(database)).toBe('half seeded');
    await wipe(database);
    expect(await database.query('SELECT * FROM person')).toEqual([]);
    await beginSeeding(database);
    await enrol('member@larkmoor.example');
    await endSeeding(database);
    expect(await stateOfClub(database)).toBe('inhabited');
  });

  it('a club with somebody else in it is never thrown away', async () => {
    await beginSeeding(database);
    await enrol('member@larkmoor.example');
    await enrol('somebody@elsewhere.example');
    expect(await stateOfClub(database)).toBe('inhabited');
  });
});
