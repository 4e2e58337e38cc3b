import { lowPassLadder } from '@ferrite-row/levels';
import { expect, it } from 'vitest';
import { perform } from './tasks';

const asked = {
  ladder: lowPassLadder({
    family: 'Butterworth',
    order: 3,
    cutoffHertz: 10e6,
    sourceOhms: 50,
    first: 'shunt',
  }),
  toleranceRel: 0,
  seed: 1,
  plotHertz: Float64Array.of(10e6),
  carrierHertz: 1e6,
  bandHertz: Float64Array.of(1e6),
  limitHertz: Float64Array.of(20e6),
};

it('hands a result over as plain data', () => {
  const outcome = perform('filterBuilds', asked);
  // Butterworth: half power at the edge, whatever the build when the parts do not scatter.
  expect('result' in outcome && outcome.result.bands.gainDb[0][0]).toBeCloseTo(-3.0103, 3);
});

it('hands over a problem with the name of the field it belongs to', () => {
  expect(perform('filterBuilds', { ...asked, toleranceRel: 2 })).toMatchObject({
    problem: { input: 'toleranceRel' },
  });
});
