import { SettableClock } from '@ferrite-row/api/common/clock';
import dataSource from '@ferrite-row/api/database/data-source';
import { stateOfClub, wipe } from './state';

/** Fills an empty database with the demo club. A database with anybody else in it is left as it is. */
async function main(): Promise<void> {
  if (process.env.NODE_ENV === 'production') throw new Error('The demo club is not seeded in production.');
  if (await isInhabited()) return console.log('The club has people already: nothing is seeded.');
  // Laying out a past must not set off today's jobs, such as sending its mail.
  process.env.FERRITE_JOBS = 'off';
  // Loaded only now: the whole API takes two seconds to load, which a warm start need not pay.
  const { openContext } = await import('@ferrite-row/api/context');
  const { seedDemoClub } = await import('./demo-club.js');
  const clock = new SettableClock(new Date());
  const context = await openContext(clock);
  try {
    const began = performance.now();
    const counts = await seedDemoClub(context, clock);
    const seconds = ((performance.now() - began) / 1000).toFixed(1);
    const written = Object.entries(counts).map(([what, n]) => `${n} ${what}`);
    console.log(`Seeded the demo club in ${seconds} s: ${written.join(', ')}.`);
  } finally {
    await context.close();
  }
}

/** Asked with a bare connection, without wiring the API. */
async function isInhabited(): Promise<boolean> {
  await dataSource.initialize();
  try {
    const state = await stateOfClub(dataSource);
    if (state === 'half seeded') await wipe(dataSource);
    return state === 'inhabited';
  } finally {
    await dataSource.destroy();
  }
}

void main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
