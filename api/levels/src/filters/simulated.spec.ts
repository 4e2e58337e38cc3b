import { simulatedLadder } from '../../testing/simulated-ladder';
import { within } from '../../testing/within';
import {
  coupledResonatorBandPass,
  fitLadder,
  highPassLadder,
  type Ladder,
  ladderResponse,
  lowPassLadder,
  type PartQ,
} from '../index';

// Circuits simulated in Debian's ngspice (package ngspice), part by part, over frequency.

const low = { sourceOhms: 50, first: 'shunt' } as const;
const chebyshev = (order: number, rippleDb: number) => ({ family: 'Chebyshev', order, rippleDb }) as const;
const butterworth = (order: number) => ({ family: 'Butterworth', order }) as const;
const band = { sourceOhms: 50, loadOhms: 50 };
const real = { capacitors: { series: 'E12', atMostParts: 2 }, inductors: { alNanohenry: 4.2 } } as const;

/** Spread over two octaves either side of what matters. */
const around = (hertz: number) =>
  Array.from({ length: 21 }, (_value, index) => hertz * 2 ** ((index - 10) / 5));
/** Close in and far out. */
const across = (hertz: number, width: number) => [
  ...Array.from({ length: 17 }, (_value, index) => hertz + (width * (index - 8)) / 4),
  hertz / 2,
  2 * hertz,
  3 * hertz,
];

const circuits: [string, Ladder, number[], PartQ][] = [
  [
    'Butterworth low-pass of 5',
    lowPassLadder({ ...low, ...butterworth(5), cutoffHertz: 7.5e6 }),
    around(7.5e6),
    {},
  ],
  [
    'Chebyshev low-pass of 7 from real parts with Q 180 and 1000',
    fitLadder(lowPassLadder({ ...low, ...chebyshev(7, 0.1), cutoffHertz: 15.5e6 }), real),
    around(15.5e6),
    { inductorQ: 180, capacitorQ: 1000 },
  ],
  [
    'Chebyshev low-pass of 9, coil first, with Q 100',
    lowPassLadder({ ...chebyshev(9, 0.01), cutoffHertz: 4.5e6, sourceOhms: 50, first: 'series' }),
    around(4.5e6),
    { inductorQ: 100 },
  ],
  [
    'Chebyshev low-pass of 4 into its unequal load',
    lowPassLadder({ ...low, ...chebyshev(4, 0.5), cutoffHertz: 15e6 }),
    around(15e6),
    {},
  ],
  [
    'Chebyshev low-pass of 6 in 200 ohm, coil first',
    lowPassLadder({ ...chebyshev(6, 0.1), cutoffHertz: 30e6, sourceOhms: 200, first: 'series' }),
    around(30e6),
    { inductorQ: 150, capacitorQ: 500 },
  ],
  [
    'Butterworth high-pass of 5 with Q 120',
    highPassLadder({ ...butterworth(5), cutoffHertz: 1.6e6, sourceOhms: 50, first: 'series' }),
    around(1.6e6),
    { inductorQ: 120, capacitorQ: 800 },
  ],
  [
    'Chebyshev high-pass of 7, coil first',
    highPassLadder({ ...low, ...chebyshev(7, 0.2), cutoffHertz: 3e6 }),
    around(3e6),
    {},
  ],
  [
    'Butterworth band-pass of two resonators with Q 150',
    coupledResonatorBandPass({
      ...band,
      ...butterworth(2),
      centreHertz: 7.1e6,
      bandwidthHertz: 300e3,
      resonatorHenries: 1e-6,
    }),
    across(7.1e6, 300e3),
    { inductorQ: 150, capacitorQ: 2000 },
  ],
  [
    'Chebyshev band-pass of three resonators from real parts',
    fitLadder(
      coupledResonatorBandPass({
        ...band,
        ...chebyshev(3, 0.1),
        centreHertz: 14.2e6,
        bandwidthHertz: 700e3,
        resonatorHenries: 0.4e-6,
      }),
      real,
    ),
    across(14.2e6, 700e3),
    { inductorQ: 200 },
  ],
  [
    'Chebyshev band-pass of four resonators, 50 to 75 ohm',
    coupledResonatorBandPass({
      ...chebyshev(4, 0.05),
      sourceOhms: 50,
      loadOhms: 75,
      centreHertz: 5.4e6,
      bandwidthHertz: 200e3,
      resonatorHenries: 1.5e-6,
    }),
    across(5.4e6, 200e3),
    { inductorQ: 250 },
  ],
];

describe('ladders simulated in ngspice', () => {
  it.each(circuits)('%s: gain and return loss within 0.01 dB over frequency', (_title, ladder, hertz, q) => {
    const response = ladderResponse(ladder, Float64Array.from(hertz), q);
    const simulated = simulatedLadder(ladder, hertz, q);
    simulated.forEach(({ gainDb, returnLossDb }, point) => {
      within(response.gainDb[point], gainDb, 0.01);
      // Deep in a notch of the return loss the six digits the simulator prints show.
      if (returnLossDb < 50) within(response.returnLossDb[point], returnLossDb, 0.01);
    });
    expect(Math.min(...response.gainDb)).toBeLessThan(-10);
    expect(Math.max(...response.gainDb)).toBeGreaterThan(-4);
  });
});
