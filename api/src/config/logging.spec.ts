import { Writable } from 'node:stream';
import { pinoHttp } from 'pino-http';
import { DataSource } from 'typeorm';
import { createDatabase } from '../../test/database';
import { loggingOptions } from './logging';

const INSERT = `INSERT INTO person (email, name, password_hash) VALUES ($1, 'Some One', $2)`;

describe('the log', () => {
  let dataSource: DataSource;
  let drop: () => Promise<void>;

  beforeAll(async () => {
    const database = await createDatabase();
    drop = database.drop;
    dataSource = await new DataSource({ type: 'postgres', url: database.url }).initialize();
  });
  afterAll(async () => {
    await dataSource.destroy();
    await drop();
  });

  const logged = (err: unknown): string => {
    const lines: string[] = [];
    const stream = new Writable({
      write: (chunk: Buffer, _encoding, done) => {
        lines.push(chunk.toString());
        done();
      },
    });
    pinoHttp({ ...loggingOptions('info'), stream }).logger.error({ err }, 'It went wrong');
    return lines.join('');
  };

  it('says what the database refused, and none of the values it was sent', async () => {
    const values = ['tamsin@larkmoor.example', 'a password hash'];
    await dataSource.query(INSERT, values);
    const error: unknown = await dataSource.query(INSERT, values).catch((thrown: unknown) => thrown);
    const line = logged(error);
    expect(JSON.parse(line)).toMatchObject({
      msg: 'It went wrong',
      err: { type: 'QueryFailedError', code: '23505', constraint: 'person_email_once', query: INSERT },
    });
    expect(line).not.toMatch(/tamsin|a password hash/);
  });

  it('says where an error came from, and bears whatever is thrown', () => {
    const { err } = JSON.parse(logged(new TypeError('no such thing'))) as { err: Record<string, string> };
    expect(err).toMatchObject({ type: 'TypeError', message: 'no such thing' });
    expect(err.stack).toContain('logging.spec');
    expect(logged('a word')).not.toContain('a word');
  });
});
