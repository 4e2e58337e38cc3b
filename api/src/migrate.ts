import dataSource from './database/data-source';

/** Brings the schema up to date and exits. An advisory lock lets several processes be started at once. */
async function migrate(): Promise<void> {
  await dataSource.initialize();
  const runner = dataSource.createQueryRunner();
  try {
    await runner.query(`SELECT pg_advisory_lock(hashtextextended('ferrite-row:migrate', 0))`);
    const done = await dataSource.runMigrations({ transaction: 'each' });
    console.log(
      done.length === 0 ? 'The schema is up to date.' : `Migrated: ${done.map((m) => m.name).join(', ')}`,
    );
  } finally {
    await runner.query(`SELECT pg_advisory_unlock(hashtextextended('ferrite-row:migrate', 0))`);
    await runner.release();
    await dataSource.destroy();
  }
}

void migrate().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
