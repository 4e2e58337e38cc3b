import fc from 'fast-check';
import table from '../../reference/filters.json';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { within, withinRel } from '../../testing/within';
import {
  coupledResonatorBandPass,
  dissipationLossDb,
  type FilterFamily,
  frequencyGrid,
  harmonicRejections,
  highPassLadder,
  idealAttenuationDb,
  type Ladder,
  type LadderElement,
  ladderResponse,
  leastOrder,
  lowPassLadder,
  OutOfDomainError,
  prototypeOf,
  type PrototypeInput,
  rippleFromReturnLoss,
} from '../index';

// Values, tolerances and sources: api/levels/reference/filters.json, each row with its own source.

const familyOf = (type: string): FilterFamily => (type === 'butterworth' ? 'Butterworth' : 'Chebyshev');
const shapeOf = (inputs: { type: string; n: number; ripple_dB?: number | null }): PrototypeInput => {
  return { family: familyOf(inputs.type), order: inputs.n, rippleDb: inputs.ripple_dB ?? undefined };
};
const gainAt = (ladder: Ladder, hertz: number, inductorQ?: number) =>
  ladderResponse(ladder, Float64Array.of(hertz), { inductorQ }).gainDb[0];

/** The low-pass with every element resonated at the centre: the classical band-pass, no approximation in it. */
function transformed(shape: PrototypeInput, centreHertz: number, fraction: number): Ladder {
  const r = 50;
  const omega = 2 * Math.PI * centreHertz;
  const { elements } = prototypeOf(shape);
  const parts = elements.flatMap((g, index): LadderElement[] => {
    const place = index % 2 === 0 ? 'shunt' : 'series';
    const x = place === 'shunt' ? (fraction * r) / g : (g * r) / fraction;
    return [
      { name: `L${index}`, place, part: 'inductor', value: x / omega },
      { name: `C${index}`, place, part: 'capacitor', value: 1 / (x * omega) },
    ];
  });
  return { elements: parts, sourceOhms: r, loadOhms: r };
}

const shapes = fc.record({
  family: fc.constantFrom('Butterworth' as const, 'Chebyshev' as const),
  order: fc.integer({ min: 1, max: 11 }),
  rippleDb: between(0.001, 1),
});
const first = fc.constantFrom('series' as const, 'shunt' as const);
const ratios = between(0.1, 3);

describe('ladders against published elements and simulated loss', () => {
  it.each(table.ladders)('$id', ({ inputs, expected, tolerance }) => {
    const ladder = lowPassLadder({
      ...shapeOf(inputs),
      cutoffHertz: inputs.fc_Hz,
      sourceOhms: inputs.Rs_ohm,
      first: inputs.first === 'shunt C' ? 'shunt' : 'series',
    });
    withinRel(ladder.loadOhms, expected.R_load_ohm, tolerance.element_rel);
    expected.elements.forEach((published, index) => {
      const element = ladder.elements[index];
      const isCoil = published.L_H !== undefined;
      expect(element?.part).toBe(isCoil ? 'inductor' : 'capacitor');
      withinRel(element?.value, published.L_H ?? published.C_F ?? NaN, tolerance.element_rel);
    });
    for (const { f_Hz: hertz, dB } of expected.attenuation_simulated) {
      within(-(gainAt(ladder, hertz) ?? NaN), dB, tolerance.dB);
    }
  });
});

describe('loss in the band from finite Q', () => {
  it.each(table.dissipation)('$id: estimate and simulated loss', ({ inputs, expected, tolerance }) => {
    const shape = shapeOf(inputs);
    const { f0_Hz: centre, fractional_bandwidth: fraction, Qu } = inputs;
    within(dissipationLossDb(shape, fraction, Qu), expected.approx_midband_loss_dB, tolerance.approx_dB);
    const ladder = transformed(shape, centre, fraction);
    within(-(gainAt(ladder, centre, Qu) ?? NaN), expected.simulated_midband_loss_dB, tolerance.simulated_dB);
  });

  it('is what a coupled-resonator filter loses too, to a tenth of a decibel', () => {
    const ladder = coupledResonatorBandPass({
      family: 'Butterworth',
      order: 3,
      centreHertz: 14.2e6,
      bandwidthHertz: 0.5e6,
      sourceOhms: 50,
      loadOhms: 50,
      resonatorHenries: 0.5e-6,
    });
    const { gainDb } = ladderResponse(ladder, frequencyGrid(14e6, 14.4e6, 401), { inductorQ: 200 });
    within(
      -Math.max(...gainDb),
      dissipationLossDb({ family: 'Butterworth', order: 3 }, 0.5 / 14.2, 200),
      0.1,
    );
  });
});

describe('ladders designed', () => {
  it('have the loss their formula says, low-pass and high-pass, whatever stands first', () => {
    fc.assert(
      fc.property(shapes, first, ratios, (shape, place, ratio) => {
        const input = { ...shape, cutoffHertz: 7e6, sourceOhms: 50, first: place };
        const ideal = idealAttenuationDb(shape, ratio);
        expect(gainAt(lowPassLadder(input), 7e6 * ratio)).toBeCloseTo(-ideal, 5);
        expect(gainAt(highPassLadder(input), 7e6 / ratio)).toBeCloseTo(-ideal, 5);
      }),
    );
  });

  it('of coupled resonators pass their band, and take what the prototype says beside it', () => {
    const shape = { family: 'Chebyshev', order: 3, rippleDb: 0.1 } as const;
    const ladder = coupledResonatorBandPass({
      ...shape,
      centreHertz: 14.2e6,
      bandwidthHertz: 0.7e6,
      sourceOhms: 50,
      loadOhms: 50,
      resonatorHenries: 0.4e-6,
    });
    const band = ladderResponse(ladder, frequencyGrid(13.95e6, 14.45e6, 101));
    // In narrow band the design is an approximation: 0.1 dB of ripple comes out a little deeper at one edge.
    expect(Math.min(...band.gainDb)).toBeGreaterThan(-0.3);
    for (const offset of [1.5e6, -1.5e6]) {
      const at = 14.2e6 + offset;
      const ratio = Math.abs((14.2e6 / 0.7e6) * (at / 14.2e6 - 14.2e6 / at));
      within(-(gainAt(ladder, at) ?? NaN), idealAttenuationDb(shape, ratio), 4);
    }
  });

  it('of coupled resonators keep the ends they are given, also for an even-order Chebyshev', () => {
    const ladder = coupledResonatorBandPass({
      family: 'Chebyshev',
      order: 4,
      rippleDb: 0.1,
      centreHertz: 7.1e6,
      bandwidthHertz: 0.2e6,
      sourceOhms: 50,
      loadOhms: 75,
      resonatorHenries: 1e-6,
    });
    expect([ladder.sourceOhms, ladder.loadOhms]).toEqual([50, 75]);
    const { gainDb } = ladderResponse(ladder, frequencyGrid(7.05e6, 7.15e6, 101));
    expect(Math.min(...gainDb)).toBeGreaterThan(-0.25);
  });
});

describe('what a filter is not asked for', () => {
  const low = { family: 'Butterworth', order: 3, cutoffHertz: 7e6, sourceOhms: 50, first: 'shunt' } as const;
  const band = {
    family: 'Butterworth',
    order: 3,
    centreHertz: 14e6,
    bandwidthHertz: 0.5e6,
    sourceOhms: 50,
    loadOhms: 50,
    resonatorHenries: 0.5e-6,
  } as const;
  const ladder = lowPassLadder(low);

  it.each<[string, string, () => unknown]>([
    ['order 0', 'order', () => lowPassLadder({ ...low, order: 0 })],
    ['order 16', 'order', () => lowPassLadder({ ...low, order: 16 })],
    ['order 2.5', 'order', () => lowPassLadder({ ...low, order: 2.5 })],
    ['a family not offered', 'family', () => lowPassLadder({ ...low, family: 'Bessel' as 'Butterworth' })],
    ['a Chebyshev without ripple', 'rippleDb', () => lowPassLadder({ ...low, family: 'Chebyshev' })],
    ['a ripple of 4 dB', 'rippleDb', () => lowPassLadder({ ...low, family: 'Chebyshev', rippleDb: 4 })],
    ['a cutoff of 0', 'cutoffHertz', () => highPassLadder({ ...low, cutoffHertz: 0 })],
    ['no source', 'sourceOhms', () => highPassLadder({ ...low, sourceOhms: 0 })],
    ['a first element nowhere', 'first', () => lowPassLadder({ ...low, first: 'middle' as 'shunt' })],
    ['one resonator', 'order', () => coupledResonatorBandPass({ ...band, order: 1 })],
    [
      'a band as wide as a third',
      'bandwidthHertz',
      () => coupledResonatorBandPass({ ...band, bandwidthHertz: 5e6 }),
    ],
    [
      'a coil too small for its ends',
      'resonatorHenries',
      () => coupledResonatorBandPass({ ...band, resonatorHenries: 1e-9 }),
    ],
    ['no elements', 'elements', () => ladderResponse({ ...ladder, elements: [] }, Float64Array.of(1e6))],
    [
      'a part of nothing',
      'C1',
      () =>
        ladderResponse(
          { ...ladder, elements: ladder.elements.map((e) => ({ ...e, value: 0 })) },
          Float64Array.of(1e6),
        ),
    ],
    ['no frequency', 'hertz', () => ladderResponse(ladder, new Float64Array(0))],
    ['direct current', 'hertz', () => ladderResponse(ladder, Float64Array.of(0))],
    ['a Q of 0', 'inductorQ', () => ladderResponse(ladder, Float64Array.of(1e6), { inductorQ: 0 })],
    ['a grid upside down', 'highHertz', () => frequencyGrid(2e6, 1e6, 3)],
    [
      'more than any order takes',
      'attenuationDb',
      () => leastOrder({ family: 'Butterworth', ratio: 1.1, attenuationDb: 60 }),
    ],
    ['a return loss no filter has', 'returnLossDb', () => rippleFromReturnLoss(0)],
    [
      'the first harmonic',
      'harmonic',
      () =>
        harmonicRejections(
          { ladder, capacitorToleranceRel: 0, inductorToleranceRel: 0, builds: 1, seed: 1 },
          7e6,
          [{ harmonic: 1, neededDb: 10 }],
        ),
    ],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
