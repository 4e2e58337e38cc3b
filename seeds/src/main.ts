import { openContext } from '@ferrite-row/api/context';
import { SettableClock } from '@ferrite-row/api/common/clock';
import { seedDemoClub } from './demo-club';
import { stateOfClub, wipe } from './state';

/** Fills an empty database with the demo club. A database with anybody else in it is left as it is. */
async function main(): Promise<void> {
  if (process.env.NODE_ENV === 'production') throw new Error('The demo club is not seeded in production.');
  // Laying out a past must not set off today's jobs, such as sending its mail.
  process.env.FERRITE_JOBS = 'off';
  const clock = new SettableClock(new Date());
  const context = await openContext(clock);
  try {
    const state = await stateOfClub(context);
    if (state === 'inhabited') return console.log('The club has people already: nothing is seeded.');
    if (state === 'half seeded') await wipe(context);
    const began = performance.now();
    const counts = await seedDemoClub(context, clock);
    const seconds = ((performance.now() - began) / 1000).toFixed(1);
    console.log(
      `Seeded the demo club in ${seconds} s: ${Object.entries(counts)
        .map(([what, n]) => `${n} ${what}`)
        .join(', ')}.`,
    );
  } finally {
    await context.close();
  }
}

void main().catch((error: unknown) => {
  console.error(error);
  process.exitCode = 1;
});
