import fc from 'fast-check';
import cascade from '../../reference/cascade.json';
import table from '../../reference/inductors.json';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { simulatedLadder } from '../../testing/simulated-ladder';
import { within, withinRel } from '../../testing/within';
import {
  alFromMicrohenriesPer100,
  alFromMillihenriesPer1000,
  alFromWinding,
  capacitiveReactance,
  coilQ,
  henriesOfTurns,
  inductiveReactance,
  type Ladder,
  type LadderElement,
  ladderResponse,
  lNetworks,
  loadedQ,
  matchFromImpedance,
  matchFromReflection,
  matchFromReturnLoss,
  matchFromVswr,
  mismatchBounds,
  OutOfDomainError,
  peakFluxTesla,
  resonantHertz,
  resonatingFarads,
  resonatingHenries,
  resonatorLossDb,
  singleLayerHenries,
  singleLayerTurns,
  skinDepthMetres,
  turnsFor,
  wireOhmsPerMetre,
} from '../index';

// Values, tolerances and sources: api/levels/reference/cascade.json and inductors.json, each row with its own source.

const INCH = 0.0254;

describe('matches against published tables', () => {
  it.each(cascade.mismatch)('$id', ({ inputs, expected, tolerance }) => {
    const { VSWR: vswr, return_loss_dB: returnLoss } = inputs;
    const found = vswr === undefined ? matchFromReturnLoss(returnLoss ?? NaN) : matchFromVswr(vswr);
    within(found.reflection, expected.rho, tolerance.abs);
    within(found.mismatchLossDb, expected.mismatch_loss_dB, tolerance.abs);
    within(100 * found.reflectedPower, expected.reflected_pct, tolerance.abs);
    if (expected.VSWR !== undefined) within(found.vswr, expected.VSWR, tolerance.abs);
    if (expected.return_loss_dB === null) expect(found.returnLossDb).toBeUndefined();
    else if (expected.return_loss_dB !== undefined)
      within(found.returnLossDb, expected.return_loss_dB, tolerance.abs);
  });

  it.each(cascade.loads)('$id: $inputs.Z_ohm ohm', ({ inputs, expected, tolerance }) => {
    const [resistanceOhms = NaN, reactanceOhms = NaN] = inputs.Z_ohm;
    const found = matchFromImpedance({ resistanceOhms, reactanceOhms }, inputs.Z0_ohm);
    within(found.reflection, expected.rho, tolerance.abs);
    within(found.returnLossDb, expected.return_loss_dB, tolerance.abs);
    if (expected.VSWR === null) expect(found.vswr).toBeUndefined();
    else within(found.vswr, expected.VSWR, tolerance.abs);
  });

  it('are one match whichever figure it is told by', () => {
    fc.assert(
      fc.property(between(1.0001, 1000), (vswr) => {
        const told = matchFromVswr(vswr);
        expect(matchFromReturnLoss(told.returnLossDb ?? NaN).vswr).toBeCloseTo(vswr, 6);
        expect(matchFromReflection(told.reflection)).toEqual(told);
      }),
    );
  });
});

describe('two mismatches facing each other', () => {
  it('bound what any distance between them can do', () => {
    const size = between(0, 0.95);
    fc.assert(
      fc.property(size, size, between(0, 2 * Math.PI), (source, load, phase) => {
        const { leastDb, greatestDb } = mismatchBounds(source, load);
        // |1 − ρs·ρl·e^(jφ)|, the factor of the transducer gain that depends on phase.
        const db =
          20 * Math.log10(Math.hypot(1 - source * load * Math.cos(phase), source * load * Math.sin(phase)));
        expect(-db).toBeLessThanOrEqual(greatestDb + 1e-9);
        expect(-db).toBeGreaterThanOrEqual(leastDb - 1e-9);
      }),
    );
  });

  it('do nothing when one of them is none', () => {
    expect(mismatchBounds(0, 0.5)).toEqual({ leastDb: 0, greatestDb: 0, limitDb: 0 });
  });
});

describe('windings against published values', () => {
  it.each(table.toroids)('$id', ({ inputs, expected, tolerance }) => {
    const found = turnsFor(inputs.L_H, inputs.AL_nH_per_turn2);
    withinRel(found.exactTurns, expected.turns_exact, tolerance.rel);
    expect(found.turns).toBe(expected.turns);
    withinRel(found.henries, expected.L_actual_H, tolerance.rel);
    within(100 * found.errorRel, expected.error_pct, 0.001);
    withinRel(henriesOfTurns(found.turns, inputs.AL_nH_per_turn2), expected.L_actual_H, tolerance.rel);
  });

  it('are never beaten by one turn more or less', () => {
    const henries = fc.double({ min: 1e-8, max: 1e-3, noNaN: true });
    fc.assert(
      fc.property(henries, between(1, 1000), (wanted, al) => {
        const { turns, errorRel } = turnsFor(wanted, al);
        for (const other of [turns - 1, turns + 1].filter((count) => count >= 1 && count <= 1e4)) {
          fc.pre(turns <= 1e4);
          const error = henriesOfTurns(other, al) / wanted - 1;
          expect(Math.abs(errorRel)).toBeLessThanOrEqual(Math.abs(error) + 1e-12);
        }
      }),
    );
  });

  it('al-unit, al-measure: A_L in every unit tables print', () => {
    within(alFromMicrohenriesPer100(49), 4.9, 1e-9);
    within(alFromMillihenriesPer1000(885), 885, 1e-9);
    withinRel(turnsFor(1e-6, alFromMicrohenriesPer100(57)).exactTurns, 13.2453, 1e-4);
    within(alFromWinding(10, 5.7e-7), 5.7, 1e-9);
  });

  it.each(table.single_layer)('$id', ({ inputs, expected, tolerance }) => {
    const metres = (inches?: number, millimetres?: number) =>
      inches === undefined ? (millimetres ?? NaN) / 1000 : inches * INCH;
    const coil = {
      diameterMetres: metres(inputs.diameter_in, inputs.diameter_mm),
      lengthMetres: metres(inputs.length_in, inputs.length_mm),
    };
    if (inputs.turns === undefined) {
      withinRel(
        singleLayerTurns(coil, (inputs.L_uH ?? NaN) * 1e-6),
        expected.turns_exact ?? NaN,
        tolerance.rel,
      );
      return;
    }
    withinRel(singleLayerHenries(coil, inputs.turns) * 1e6, expected.L_uH ?? NaN, tolerance.rel);
    // The current sheet is the exact sum; the formula claims 1 % of it.
    if (expected.L_current_sheet_uH === undefined) return;
    withinRel(singleLayerHenries(coil, inputs.turns) * 1e6, expected.L_current_sheet_uH, 0.01);
  });

  it.each(table.skin_depth)('$id', ({ inputs, expected, tolerance }) => {
    withinRel(1e6 * skinDepthMetres(inputs.f_Hz, inputs.rho_ohm_m), expected.depth_um, tolerance.rel);
  });

  const wired = table.skin_depth.filter(
    ({ expected }) => expected.round_wire_1mm_Rac_ohm_per_m_approx !== null,
  );
  it.each(wired)('$id: resistance of a wire of 1 mm', ({ inputs, expected, tolerance }) => {
    const found = wireOhmsPerMetre(inputs.f_Hz, 1e-3, inputs.rho_ohm_m);
    withinRel(found, expected.round_wire_1mm_Rac_ohm_per_m_approx ?? NaN, tolerance.rel);
  });

  it('skin-60: at mains frequency the current fills the wire, and it is refused', () => {
    expect(errorOf(() => wireOhmsPerMetre(60, 1e-3)).input).toBe('diameterMetres');
  });

  it('flux-1: peak flux density, tesla for gauss', () => {
    const input = { voltsRms: 31.6228, frequencyHertz: 3.5e6, turns: 12, areaSquareMetres: 0.114e-4 };
    withinRel(peakFluxTesla(input) * 1e4, 148.752, 1e-3);
  });
});

describe('resonance and reactance against published values', () => {
  it.each(table.resonance)('$id', ({ inputs, expected, tolerance }) => {
    const { L_H: henries, C_F: farads, f_Hz: frequency } = inputs;
    if (frequency !== undefined) {
      const found = resonatingHenries(frequency, farads);
      withinRel(found, expected.L_H ?? NaN, tolerance.rel);
      withinRel(resonatingFarads(frequency, found), farads, 1e-12);
      return;
    }
    const resonant = resonantHertz(henries ?? NaN, farads);
    withinRel(resonant, expected.f_Hz ?? NaN, tolerance.rel);
    withinRel(inductiveReactance(resonant, henries ?? NaN), expected.X_ohm ?? NaN, tolerance.rel);
    withinRel(-capacitiveReactance(resonant, farads), expected.X_ohm ?? NaN, tolerance.rel);
  });

  it.each(table.reactance)('$id', ({ inputs, expected, tolerance }) => {
    const { f_Hz: frequency, L_H: henries, C_F: farads } = inputs;
    const found =
      henries === undefined
        ? capacitiveReactance(frequency, farads ?? NaN)
        : inductiveReactance(frequency, henries);
    withinRel(found, expected.X_ohm, tolerance.rel);
  });

  it('q-1 to q-3: Q of a coil, of a resonator, and what a resonator loses', () => {
    withinRel(coilQ(7.1e6, 2.2e-6, 0.6), 163.572, 1e-4);
    withinRel(loadedQ(7.1e6, 50e3), 142, 1e-4);
    within(resonatorLossDb(20, 200), 0.9151, 1e-3);
  });
});

/** Impedance into a network ended by a load, by ordinary complex arithmetic from the load back. */
function seenInto(elements: readonly LadderElement[], load: { re: number; im: number }, hertz: number) {
  const over = ({ re, im }: { re: number; im: number }) => {
    const size = re * re + im * im;
    return { re: re / size, im: -im / size };
  };
  let z = load;
  for (const { place, part, value } of [...elements].reverse()) {
    const x = 2 * Math.PI * hertz * value;
    const reactance = part === 'inductor' ? x : -1 / x;
    if (place === 'series') z = { re: z.re, im: z.im + reactance };
    else {
      const y = over(z);
      z = over({ re: y.re, im: y.im - 1 / reactance });
    }
  }
  return z;
}

describe('L-networks', () => {
  const resistance = between(1, 2000);
  const reactance = between(-500, 500);

  it('turn any load into the source, every one of them', () => {
    fc.assert(
      fc.property(resistance, resistance, reactance, (sourceOhms, r, x) => {
        fc.pre(Math.abs(r / sourceOhms - 1) > 1e-3);
        const networks = lNetworks({
          sourceOhms,
          load: { resistanceOhms: r, reactanceOhms: x },
          frequencyHertz: 7e6,
        });
        expect(networks.length).toBeGreaterThanOrEqual(2);
        for (const { elements } of networks) {
          const seen = seenInto(elements, { re: r, im: x }, 7e6);
          expect(seen.re / sourceOhms).toBeCloseTo(1, 6);
          expect(seen.im / sourceOhms).toBeCloseTo(0, 6);
        }
      }),
    );
  });

  it('for a resistive load are two, low-pass and high-pass, with Q = √(Rhigh/Rlow − 1)', () => {
    fc.assert(
      fc.property(resistance, resistance, (sourceOhms, r) => {
        fc.pre(Math.abs(r / sourceOhms - 1) > 1e-3);
        const load = { resistanceOhms: r, reactanceOhms: 0 };
        const networks = lNetworks({ sourceOhms, load, frequencyHertz: 7e6 });
        expect(networks.map(({ passes }) => passes).sort()).toEqual(['high', 'low']);
        const q = Math.sqrt(Math.max(r, sourceOhms) / Math.min(r, sourceOhms) - 1);
        for (const network of networks) expect(network.q).toBeCloseTo(q, 6);
      }),
    );
  });

  it('are up to four for a load with reactance, and may need only one element', () => {
    const many = lNetworks({
      sourceOhms: 50,
      load: { resistanceOhms: 30, reactanceOhms: 100 },
      frequencyHertz: 7e6,
    });
    expect(many).toHaveLength(4);
    const half = { resistanceOhms: 50, reactanceOhms: 30 };
    const [simple] = lNetworks({ sourceOhms: 50, load: half, frequencyHertz: 7e6 }).filter(
      ({ elements }) => elements.length === 1,
    );
    expect(simple?.elements[0]).toMatchObject({ place: 'series', part: 'capacitor' });
  });

  const circuits = [12.5, 200, 1000].flatMap((resistanceOhms) =>
    lNetworks({ sourceOhms: 50, load: { resistanceOhms, reactanceOhms: 0 }, frequencyHertz: 14.2e6 }).map(
      ({ elements, passes }): [string, Ladder] => [
        `${passes}-pass to ${resistanceOhms} ohm`,
        { elements, sourceOhms: 50, loadOhms: resistanceOhms },
      ],
    ),
  );

  it.each(circuits)('%s, simulated in ngspice, agrees within 0.01 dB over frequency', (_title, ladder) => {
    const hertz = Array.from({ length: 15 }, (_value, index) => 14.2e6 * 2 ** ((index - 7) / 4));
    const q = { inductorQ: 200, capacitorQ: 1000 };
    const { gainDb, returnLossDb } = ladderResponse(ladder, Float64Array.from(hertz), q);
    simulatedLadder(ladder, hertz, q).forEach((point, index) => {
      within(gainDb[index], point.gainDb, 0.01);
      if (point.returnLossDb < 50) within(returnLossDb[index], point.returnLossDb, 0.01);
    });
    expect(ladderResponse(ladder, Float64Array.of(14.2e6)).gainDb[0]).toBeCloseTo(0, 6);
  });
});

describe('what matching is not asked for', () => {
  const network = { sourceOhms: 50, load: { resistanceOhms: 12.5, reactanceOhms: 0 }, frequencyHertz: 7e6 };

  it.each<[string, string, () => unknown]>([
    ['a VSWR under 1', 'vswr', () => matchFromVswr(0.9)],
    ['a return loss under 0', 'returnLossDb', () => matchFromReturnLoss(-1)],
    ['a reflection over 1', 'reflection', () => matchFromReflection(1.01)],
    [
      'a negative resistance',
      'resistanceOhms',
      () => matchFromImpedance({ resistanceOhms: -1, reactanceOhms: 0 }, 50),
    ],
    ['a line of 0 ohm', 'lineOhms', () => matchFromImpedance({ resistanceOhms: 50, reactanceOhms: 0 }, 0)],
    ['two total reflections', 'loadReflection', () => mismatchBounds(0.5, 1)],
    [
      'a load that is matched',
      'resistanceOhms',
      () => lNetworks({ ...network, load: { resistanceOhms: 50, reactanceOhms: 0 } }),
    ],
    [
      'a load without resistance',
      'resistanceOhms',
      () => lNetworks({ ...network, load: { resistanceOhms: 0, reactanceOhms: 30 } }),
    ],
    ['a frequency of 0', 'frequencyHertz', () => lNetworks({ ...network, frequencyHertz: 0 })],
    ['a core without A_L', 'alNanohenry', () => turnsFor(1e-6, 0)],
    ['half a turn', 'turns', () => henriesOfTurns(0.5, 4)],
    [
      'a coil too short',
      'lengthMetres',
      () => singleLayerHenries({ diameterMetres: 0.02, lengthMetres: 0.005 }, 10),
    ],
    ['no capacitance', 'farads', () => resonantHertz(1e-6, 0)],
    ['a loaded Q as high as the unloaded', 'unloadedQ', () => resonatorLossDb(200, 200)],
    ['a resistivity that is no number', 'resistivityOhmMetres', () => skinDepthMetres(1e6, NaN)],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
