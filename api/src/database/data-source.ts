import { DataSource } from 'typeorm';
import { databaseOptions } from './options';

/** For TypeORM's command line and the programs that only migrate. */
export default new DataSource(databaseOptions(process.env.DATABASE_URL ?? ''));
