import table from '../../reference/filters.json';
import { within, withinRel } from '../../testing/within';
import {
  couplingCoefficients,
  type FilterFamily,
  halfPowerRatio,
  idealAttenuationDb,
  leastOrder,
  prototypeOf,
  type PrototypeInput,
  returnLossFromRipple,
  rippleFromReturnLoss,
} from '../index';

// Values, tolerances and sources: api/levels/reference/filters.json, each row with its own source.

const familyOf = (type: string): FilterFamily => (type === 'butterworth' ? 'Butterworth' : 'Chebyshev');
const shapeOf = (inputs: { type: string; n: number; ripple_dB?: number | null }): PrototypeInput => {
  return { family: familyOf(inputs.type), order: inputs.n, rippleDb: inputs.ripple_dB ?? undefined };
};

describe('prototypes against published tables', () => {
  it.each(table.prototypes)('$id', ({ inputs, expected, tolerance }) => {
    const { elements, load, cutoffDb } = prototypeOf(shapeOf(inputs));
    expect(elements).toHaveLength(expected.g.length);
    expected.g.forEach((g, index) => within(elements[index], g, tolerance.abs));
    within(load, expected.g_load, tolerance.abs);
    within(cutoffDb, expected.cutoff_dB, tolerance.abs);
    if (expected.f3dB_over_fripple === undefined || inputs.ripple_dB === undefined) return;
    withinRel(halfPowerRatio(inputs.n, inputs.ripple_dB), expected.f3dB_over_fripple, 1e-5);
    within(idealAttenuationDb(shapeOf(inputs), 0), expected.dc_loss_dB, 1e-5);
  });

  it.each(table.attenuation.filter(({ id }) => id.startsWith('att')))(
    '$id',
    ({ inputs, expected, tolerance }) => {
      const shape = shapeOf({ ...inputs, n: inputs.n ?? NaN });
      if (typeof tolerance === 'number') throw new Error('an attenuation has a tolerance in dB');
      within(idealAttenuationDb(shape, inputs.f_over_fc), expected.dB ?? NaN, tolerance.dB);
    },
  );

  it.each(table.attenuation.filter(({ id }) => id.startsWith('ord')))(
    '$id: least order',
    ({ inputs, expected }) => {
      const order = leastOrder({
        family: familyOf(inputs.type),
        rippleDb: inputs.ripple_dB ?? undefined,
        ratio: inputs.f_over_fc,
        attenuationDb: inputs.wanted_dB ?? NaN,
      });
      expect(order).toBe(expected.minimum_n);
    },
  );

  it.each(table.ripple_relations)(
    '$id: ripple $inputs.ripple_dB dB and return loss',
    ({ inputs, expected, tolerance }) => {
      within(returnLossFromRipple(inputs.ripple_dB), expected.return_loss_dB, tolerance.abs);
      within(rippleFromReturnLoss(returnLossFromRipple(inputs.ripple_dB)), inputs.ripple_dB, 1e-9);
    },
  );

  it.each(table.coupled_resonators.filter(({ id }) => id !== 'kq-denorm-1'))('$id: k and q', (row) => {
    if (!('n' in row.inputs) || !('k' in row.expected) || typeof row.tolerance === 'number')
      throw new Error('row');
    const { sourceQ, loadQ, couplings } = couplingCoefficients(shapeOf(row.inputs));
    const tolerance = row.tolerance.abs ?? NaN;
    within(sourceQ, row.expected.q1 ?? NaN, tolerance);
    within(loadQ, row.expected.qn ?? NaN, tolerance);
    row.expected.k?.forEach((k, index) => within(couplings[index], k, tolerance));
    const over3dB = row.expected.normalised_to_3dB_bandwidth;
    if (over3dB === undefined || row.inputs.ripple_dB === null || row.inputs.ripple_dB === undefined) return;
    const ratio = halfPowerRatio(row.inputs.n, row.inputs.ripple_dB);
    within(sourceQ * ratio, over3dB.q1, tolerance);
    over3dB.k.forEach((k, index) => within((couplings[index] ?? NaN) / ratio, k, tolerance));
  });

  it('kq-denorm-1: coupling and loading of a real filter', () => {
    const { sourceQ, couplings } = couplingCoefficients({ family: 'Butterworth', order: 2 });
    withinRel((couplings[0] ?? NaN) * (300e3 / 7.1e6), 0.0298778, 1e-4);
    withinRel(sourceQ * (7.1e6 / 300e3), 33.4697, 1e-4);
  });
});
