import fc from 'fast-check';
import padTable from '../../reference/attenuators.json';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { simulate } from '../../testing/ngspice';
import { within, withinRel } from '../../testing/within';
import {
  designPad,
  minimumLossDb,
  OutOfDomainError,
  type PadEnds,
  padPerformance,
  type PadResistor,
  padValues,
  padWorstCase,
  ratingToBuy,
} from '../index';

// Values, tolerances and sources: api/levels/reference/attenuators.json, each row with its own source.

const matched = (lossDb: number, z = 50) => ({ lossDb, sourceOhms: z, loadOhms: z });
const valuesOf = (resistors: readonly PadResistor[]) => resistors.map(({ ohms }) => ohms);

/** Resistors of a stated pi or tee. */
function stated(topology: string, [r1 = NaN, r2 = NaN, r3 = NaN]: readonly number[]): PadResistor[] {
  const shape = padValues({ kind: topology === 'pi' ? 'pi' : 'tee', ...matched(3) });
  return shape.map((resistor, index) => ({ ...resistor, ohms: [r1, r2, r3][index] ?? NaN }));
}

describe('pads against published formulas and tables', () => {
  it.each(padTable.entries)('$id: pi, tee and bridged tee', ({ inputs, expected, tolerance }) => {
    const at = matched(inputs.dB, inputs.Z_ohm);
    const [teeSeries, teeShunt, teeOut] = valuesOf(padValues({ kind: 'tee', ...at }));
    const [piShunt, piSeries, piOut] = valuesOf(padValues({ kind: 'pi', ...at }));
    const [arm, bridge, shunt, otherArm] = valuesOf(padValues({ kind: 'bridged tee', ...at }));
    withinRel(teeSeries, expected.tee_series_ohm, tolerance.rel);
    withinRel(teeOut, expected.tee_series_ohm, tolerance.rel);
    withinRel(teeShunt, expected.tee_shunt_ohm, tolerance.rel);
    withinRel(piShunt, expected.pi_shunt_ohm, tolerance.rel);
    withinRel(piOut, expected.pi_shunt_ohm, tolerance.rel);
    withinRel(piSeries, expected.pi_series_ohm, tolerance.rel);
    withinRel(bridge, expected.bridged_tee_bridge_ohm, tolerance.rel);
    withinRel(shunt, expected.bridged_tee_shunt_ohm, tolerance.rel);
    expect([arm, otherArm]).toEqual([50, 50]);
  });

  it.each(padTable.entries)('$id: where the power goes', ({ inputs, expected }) => {
    for (const kind of ['pi', 'tee'] as const) {
      const at = matched(inputs.dB, inputs.Z_ohm);
      const { dissipationShares, lossDb } = padPerformance(padValues({ kind, ...at }), at);
      const published = expected[`${kind}_dissipation_W_per_W_in`];
      dissipationShares.forEach((share, index) => within(share, published[index] ?? NaN, 1e-5));
      withinRel(10 ** (-lossDb / 10), expected.output_W_per_W_in, 1e-5);
    }
  });

  it.each(padTable.cross_check_rows)('$id: a published table of $inputs.dB dB pads', (row) => {
    const at = matched(row.inputs.dB, row.inputs.Z_ohm ?? 50);
    // A printed figure is good to half its last place; one row prints 8.5 for 8.55.
    const printed = (figure: number) => row.tolerance.abs ?? (figure < 20 ? 0.051 : 0.51);
    for (const kind of ['tee', 'pi'] as const) {
      const published = row.expected[kind];
      const resistors = valuesOf(padValues({ kind, ...at }));
      published?.forEach((figure, index) => within(resistors[index], figure, printed(figure)));
    }
    const [bridge, shunt] = valuesOf(padValues({ kind: 'bridged tee', ...at })).slice(1);
    row.expected.bridged?.forEach((figure, index) => within([bridge, shunt][index], figure, printed(figure)));
  });

  it.each(padTable.minimum_loss_pads)('$id: minimum-loss pad', ({ inputs, expected, tolerance }) => {
    const ends = { sourceOhms: inputs.Z_high_ohm, loadOhms: inputs.Z_low_ohm };
    const resistors = padValues({ kind: 'minimum loss', ...ends });
    const [series, shunt] = valuesOf(resistors);
    withinRel(series, expected.series_on_high_side_ohm, tolerance.rel);
    withinRel(shunt, expected.shunt_on_low_side_ohm, tolerance.rel);
    within(minimumLossDb(ends.sourceOhms, ends.loadOhms), expected.loss_dB, tolerance.dB);
    within(padPerformance(resistors, ends).lossDb, expected.loss_dB, tolerance.dB);
    const turned = { sourceOhms: ends.loadOhms, loadOhms: ends.sourceOhms };
    const back = padPerformance(padValues({ kind: 'minimum loss', ...turned }), turned);
    within(back.lossDb, expected.loss_dB, tolerance.dB);
  });

  it.each(padTable.standard_value_pads)('$id: what preferred values really give', (row) => {
    const { inputs, expected, tolerance } = row;
    const found = padPerformance(stated(inputs.topology, inputs.R_ohm), matched(0, inputs.Z_ohm));
    within(found.lossDb, expected.loss_dB, tolerance.dB);
    within(found.input.returnLossDb, expected.input_return_loss_dB, tolerance.dB);
    within(found.input.vswr, expected.VSWR, tolerance.VSWR);
  });
});

const kinds = fc.constantFrom('pi' as const, 'tee' as const, 'bridged tee' as const);
const losses = between(0.05, 60);
const impedances = between(5, 1000);

describe('pads, whatever they are asked for', () => {
  it('realise their attenuation with no reflection at either end', () => {
    fc.assert(
      fc.property(kinds, losses, impedances, (kind, lossDb, z) => {
        const found = padPerformance(padValues({ kind, ...matched(lossDb, z) }), matched(0, z));
        expect(found.lossDb).toBeCloseTo(lossDb, 8);
        expect(found.input.returnLossDb ?? 200).toBeGreaterThan(120);
        expect(found.output.returnLossDb ?? 200).toBeGreaterThan(120);
      }),
    );
  });

  it('realise it between any two resistances, from their least loss up', () => {
    const kind = fc.constantFrom('pi' as const, 'tee' as const);
    fc.assert(
      fc.property(kind, losses, impedances, impedances, (shape, over, sourceOhms, loadOhms) => {
        const lossDb = minimumLossDb(sourceOhms, loadOhms) + over;
        const found = padPerformance(padValues({ kind: shape, lossDb, sourceOhms, loadOhms }), {
          sourceOhms,
          loadOhms,
        });
        expect(found.lossDb).toBeCloseTo(lossDb, 6);
        expect(found.input.ohms / sourceOhms).toBeCloseTo(1, 6);
        expect(found.output.ohms / loadOhms).toBeCloseTo(1, 6);
      }),
    );
  });

  it('add up when one follows another, and improve a return loss by twice their loss', () => {
    fc.assert(
      fc.property(losses, losses, between(5, 500), (first, second, loadOhms) => {
        fc.pre(first + second < 40);
        const whole = padPerformance(padValues({ kind: 'pi', ...matched(first + second) }), matched(0));
        const behind = padPerformance(padValues({ kind: 'tee', ...matched(second) }), matched(0));
        const before = padPerformance(padValues({ kind: 'pi', ...matched(first) }), {
          sourceOhms: 50,
          loadOhms: behind.input.ohms,
        });
        expect(before.lossDb + behind.lossDb).toBeCloseTo(whole.lossDb, 7);
        const reflection = Math.abs(loadOhms - 50) / (loadOhms + 50);
        fc.pre(reflection > 0.01 && first < 20);
        const seen = padPerformance(padValues({ kind: 'pi', ...matched(first) }), {
          sourceOhms: 50,
          loadOhms,
        });
        expect(seen.input.returnLossDb).toBeCloseTo(-20 * Math.log10(reflection) + 2 * first, 5);
      }),
    );
  });

  it('lose no power: resistors, load and what is reflected take all of it', () => {
    const parts = fc.array(between(1, 2000), { minLength: 3, maxLength: 3 });
    fc.assert(
      fc.property(kinds, parts, impedances, impedances, (kind, values, sourceOhms, loadOhms) => {
        const resistors = padValues({ kind, ...matched(6) }).map((resistor, index) => {
          return { ...resistor, ohms: values[index] ?? resistor.ohms };
        });
        const found = padPerformance(resistors, { sourceOhms, loadOhms });
        const reflected = 10 ** (-(found.input.returnLossDb ?? 300) / 10);
        const taken = found.dissipationShares.reduce((sum, share) => sum + share, 0);
        expect(taken + 10 ** (-found.lossDb / 10) + reflected).toBeCloseTo(1, 9);
      }),
    );
  });

  it('stay within their worst case wherever the resistors lie in their tolerance, and reach it', () => {
    const where = fc.array(between(-1, 1), { minLength: 4, maxLength: 4 });
    const tolerance = 0.05;
    fc.assert(
      fc.property(kinds, losses, where, (kind, lossDb, places) => {
        const ends: PadEnds = matched(0);
        const exact = padValues({ kind, ...matched(lossDb) });
        const worst = padWorstCase(exact, ends, tolerance);
        const built = exact.map((resistor, index) => {
          return { ...resistor, ohms: resistor.ohms * (1 + tolerance * (places[index] ?? 0)) };
        });
        const found = padPerformance(built, ends);
        expect(found.lossDb).toBeLessThanOrEqual(worst.greatestLossDb + 1e-9);
        expect(found.lossDb).toBeGreaterThanOrEqual(worst.leastLossDb - 1e-9);
        expect(found.input.returnLossDb ?? 300).toBeGreaterThanOrEqual(
          (worst.leastInputReturnLossDb ?? 0) - 1e-9,
        );
      }),
    );
    const ten = padWorstCase(padValues({ kind: 'pi', ...matched(10) }), matched(0), tolerance);
    // All shunts 5 % low and the series one 5 % high: the most loss a pi can have.
    const most = padPerformance(stated('pi', [96.2475 * 0.95, 71.1512 * 1.05, 96.2475 * 0.95]), matched(0));
    within(ten.greatestLossDb, most.lossDb, 1e-4);
  });
});

describe('pads simulated in ngspice', () => {
  const circuits: [string, PadResistor[], PadEnds][] = [
    ['3 dB pi of E24 parts', stated('pi', [300, 18, 300]), matched(0)],
    ['10 dB tee of E24 parts', stated('tee', [27, 36, 27]), matched(0)],
    ['6 dB bridged tee', padValues({ kind: 'bridged tee', ...matched(6) }), matched(0)],
    [
      '10 dB pi from 75 to 50 ohm',
      padValues({ kind: 'pi', lossDb: 10, sourceOhms: 75, loadOhms: 50 }),
      { sourceOhms: 75, loadOhms: 50 },
    ],
    [
      'minimum-loss pad from 50 to 75 ohm',
      padValues({ kind: 'minimum loss', sourceOhms: 50, loadOhms: 75 }),
      { sourceOhms: 50, loadOhms: 75 },
    ],
  ];

  it.each(circuits)('%s: loss within 0.01 dB, dissipation within 0.1 %%', (_title, resistors, ends) => {
    const { sourceOhms, loadOhms } = ends;
    // An emf that makes 1 W available.
    const emf = 2 * Math.sqrt(sourceOhms);
    const node = (point: string) => (point === 'ground' ? '0' : point);
    const results = simulate(
      [
        `V1 emf 0 ${emf}`,
        `RS emf in ${sourceOhms}`,
        ...resistors.map(({ name, from, to, ohms }) => `${name} ${node(from)} ${node(to)} ${ohms}`),
        `RL out 0 ${loadOhms}`,
      ],
      [
        'op',
        `let load = v(out)*v(out)/${loadOhms}`,
        ...resistors.map(({ name }) => `let p${name} = @${name.toLowerCase()}[p]`),
        `print load ${resistors.map(({ name }) => `p${name}`).join(' ')}`,
      ],
    );
    const found = padPerformance(resistors, ends);
    within(found.lossDb, -10 * Math.log10(results.load ?? NaN), 0.01);
    resistors.forEach(({ name }, index) => {
      const simulated = results[`p${name.toLowerCase()}`] ?? NaN;
      within(found.dissipationShares[index], simulated, 0.001 * simulated + 1e-9);
    });
  });
});

describe('a pad to be built', () => {
  const wanted = { kind: 'pi', ...matched(3), series: 'E24', toleranceRel: 0.05, inputWatts: 20 } as const;

  it('tells figures of the fitted parts and the exact ones apart', () => {
    const { exact, fitted, resistors } = designPad(wanted);
    within(exact.lossDb, 3, 1e-9);
    within(fitted.lossDb, 2.9946, 0.0001);
    within(resistors[0]?.exactOhms, 292.402, 0.001);
    expect(resistors[0]?.ohms).toBe(300);
  });

  it('comes nearer with two parts, each with its share of the power and its own rating', () => {
    const { fitted, resistors } = designPad({ ...wanted, atMostParts: 2, enoughRel: 0.001 });
    expect(Math.abs(fitted.lossDb - 3)).toBeLessThan(0.002);
    for (const { fitted: made, watts, ratings } of resistors) {
      expect(ratings).toHaveLength(made.parts.length);
      within(
        ratings.reduce((sum, rating) => sum + rating.watts, 0),
        watts,
        1e-9,
      );
      for (const { watts: taken, ratingWatts = NaN } of ratings)
        expect(ratingWatts).toBeGreaterThan(2 * taken - 1e-9);
    }
  });

  it('shares power by conductance in parallel and by resistance in series', () => {
    const { resistors } = designPad({ ...wanted, atMostParts: 2, enoughRel: 0, arrangements: ['series'] });
    const two = resistors.find(({ fitted: made }) => made.parts.length === 2);
    const [large = NaN, small = NaN] = two?.fitted.parts ?? [];
    expect((two?.ratings[0]?.watts ?? NaN) / (two?.ratings[1]?.watts ?? NaN)).toBeCloseTo(large / small, 9);
  });

  it('through-01: a load of 6 dB return loss looks like 18 dB through a 6 dB pad', () => {
    const row = padTable.use_checks.find(({ id }) => id === 'through-01');
    const { pad_dB: pad = NaN, load_return_loss_dB: there = NaN } = row?.inputs ?? {};
    const reflection = 10 ** (-there / 20);
    const ends = { sourceOhms: 50, loadOhms: (50 * (1 + reflection)) / (1 - reflection) };
    const { input } = padPerformance(padValues({ kind: 'pi', ...matched(pad) }), ends);
    within(input.returnLossDb, row?.expected.input_return_loss_dB ?? NaN, 0.01);
  });

  it('through-03: 100 W into 30 dB leaves 99.9 W in the pad, more than one resistor stands', () => {
    const { resistors } = designPad({ ...wanted, lossDb: 30, inputWatts: 100, atMostParts: 2, enoughRel: 0 });
    within(
      resistors.reduce((sum, { watts }) => sum + watts, 0),
      99.9,
      0.01,
    );
    expect(ratingToBuy(600)).toEqual({ watts: 600 });
  });

  it('buys the next rating at least twice the dissipation', () => {
    expect(ratingToBuy(0.125).ratingWatts).toBe(0.25);
    expect(ratingToBuy(0.1251).ratingWatts).toBe(0.5);
    expect(ratingToBuy(0.1251, 1).ratingWatts).toBe(0.25);
  });
});

describe('what a pad is not asked for', () => {
  const base = { kind: 'pi', lossDb: 3, sourceOhms: 50, loadOhms: 50 } as const;

  it.each<[string, string, () => unknown]>([
    ['no loss', 'lossDb', () => padValues({ ...base, lossDb: 0 })],
    ['a loss left out', 'lossDb', () => padValues({ ...base, lossDb: undefined })],
    [
      'a loss under the least for 75 to 50 ohm',
      'lossDb',
      () => padValues({ ...base, lossDb: 5.7, sourceOhms: 75 }),
    ],
    ['a loss no pad of one section has', 'lossDb', () => padValues({ ...base, lossDb: 130 })],
    ['a source of no resistance', 'sourceOhms', () => padValues({ ...base, sourceOhms: 0 })],
    [
      'a bridged tee between two resistances',
      'loadOhms',
      () => padValues({ ...base, kind: 'bridged tee', loadOhms: 75 }),
    ],
    ['a minimum-loss pad between equal ones', 'loadOhms', () => padValues({ ...base, kind: 'minimum loss' })],
    ['a tolerance of all of it', 'toleranceRel', () => padWorstCase(padValues(base), base, 1)],
    ['no resistors', 'resistors', () => padPerformance([], base)],
    ['a resistor of nothing', 'R2', () => padPerformance(stated('pi', [300, 0, 300]), base)],
    [
      'a negative power',
      'inputWatts',
      () => designPad({ ...base, series: 'E24', toleranceRel: 0.05, inputWatts: -1 }),
    ],
    ['a power that is no number', 'watts', () => ratingToBuy(NaN)],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
    expect(error.permitted).not.toBe('');
  });

  it('names the least loss two resistances allow', () => {
    expect(errorOf(() => padValues({ ...base, lossDb: 3, sourceOhms: 75 })).permitted).toContain(
      'more than 5.719',
    );
  });
});
