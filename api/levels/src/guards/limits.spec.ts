import fc from 'fast-check';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import {
  exposureDistances,
  exposureExemption,
  harmonicFilterFor,
  heatChain,
  instrumentGuard,
  judgeSpurs,
  loadForPower,
  onFraction,
  OutOfDomainError,
  sinkNeeded,
  spuriousLimit,
  supplyBalance,
  US_EXPOSURE,
} from '../index';

// Values, tolerances and sources: api/levels/reference/spurious.json, rf-exposure.json and thermal-and-supply.json, each
// row with its own source.

describe('an instrument guarded', () => {
  it('is harmed at its damage level, short of room under it, and neither far below', () => {
    const at = (levelDbm: number) => instrumentGuard({ levelDbm, damageDbm: 30 }).state;
    expect([at(30), at(29.9), at(20.1), at(20), at(-10)]).toEqual([
      'would harm',
      'little room',
      'little room',
      'under the limit',
      'under the limit',
    ]);
  });

  it('is judged by the highest the level may be, less the pads in line', () => {
    const found = instrumentGuard({ levelDbm: 18, plusMinusDb: 3, padsInLineDb: 6, damageDbm: 24 });
    expect([found.worstDbm, found.roomDb, found.state]).toEqual([15, 9, 'little room']);
  });

  it('is told the power each pad takes: 100 W into an analyzer that stands 1 W', () => {
    const { pads, state } = instrumentGuard({ levelDbm: 50, damageDbm: 30 });
    expect(state).toBe('would harm');
    expect(pads).toEqual([{ lossDb: 30, inputWatts: expect.closeTo(100, 9) as number, ratingWatts: 250 }]);
  });

  it('keeps its room behind the pads named, whatever the level', () => {
    const level = between(-30, 70);
    const inLine = between(0, 40);
    fc.assert(
      fc.property(level, inLine, between(0, 3), (levelDbm, padsInLineDb, plusMinusDb) => {
        const input = { levelDbm, damageDbm: 20, padsInLineDb, plusMinusDb };
        const { pads } = instrumentGuard(input);
        const added = pads.reduce((sum, { lossDb }) => sum + lossDb, 0);
        const after = instrumentGuard({ ...input, padsInLineDb: padsInLineDb + added });
        expect(after.state).toBe('under the limit');
        expect(after.pads).toEqual([]);
      }),
    );
  });

  it('needs a capacitor against a direct voltage it does not stand, whatever the level', () => {
    const bias = { levelDbm: -20, damageDbm: 30, directVolts: -50, greatestDirectVolts: 25 };
    expect(instrumentGuard(bias)).toMatchObject({ state: 'would harm', needsBlock: true, pads: [] });
    expect(instrumentGuard({ ...bias, directVolts: 12 }).needsBlock).toBe(false);
  });
});

describe('what guards and limits are not asked', () => {
  const path = {
    watts: 40,
    ambientCelsius: 25,
    junctionToCase: 1,
    caseToSink: 0.2,
    greatestJunctionCelsius: 175,
  };
  const station = {
    frequencyHertz: 14.2e6,
    peakWatts: 100,
    modeDuty: 0.4,
    onFraction: { controlled: 1, uncontrolled: 1 },
    feedLossDb: 0,
    gainDbi: 2.15,
    reflectionFactor: 2.56,
    limits: US_EXPOSURE,
  } as const;

  it.each<[string, string, () => unknown]>([
    ['a rule nobody wrote', 'rule', () => spuriousLimit('none' as 'ITU below 30 MHz', 5)],
    ['a carrier without power', 'carrierWatts', () => spuriousLimit('ITU below 30 MHz', 0)],
    ['no spurs', 'spurs', () => judgeSpurs({ attenuationDb: 43 }, [])],
    ['a level that is no number', 'dbc', () => judgeSpurs({ attenuationDb: 43 }, [{ dbc: NaN }])],
    [
      'a cutoff at the harmonic',
      'cutoffHertz',
      () =>
        harmonicFilterFor({
          carrierHertz: 7e6,
          cutoffHertz: 14e6,
          rippleDb: 0.1,
          needs: [{ harmonic: 2, neededDb: 20 }],
        }),
    ],
    ['a damage level that is no number', 'damageDbm', () => instrumentGuard({ levelDbm: 0, damageDbm: NaN })],
    [
      'a direct voltage without its limit',
      'greatestDirectVolts',
      () => instrumentGuard({ levelDbm: 0, damageDbm: 30, directVolts: 12 }),
    ],
    ['no transmission', 'onMinutes', () => onFraction(0, 5, 6)],
    ['more duty than all', 'modeDuty', () => exposureDistances({ ...station, modeDuty: 1.1 })],
    [
      'a frequency under the table',
      'frequencyHertz',
      () => exposureDistances({ ...station, frequencyHertz: 1e5 }),
    ],
    ['a distance of 0', 'distanceMetres', () => exposureExemption(14.2e6, 0, 100)],
    [
      'a junction colder than the air',
      'greatestJunctionCelsius',
      () => heatChain({ ...path, greatestJunctionCelsius: 20 }, 1),
    ],
    [
      'a device without thermal resistance',
      'junctionToCase',
      () => heatChain({ ...path, junctionToCase: 0 }, 1),
    ],
    ['a sink for no heat', 'watts', () => sinkNeeded({ ...path, watts: 0 })],
    [
      'more out than in',
      'outputWatts',
      () => supplyBalance({ volts: 10, amperes: 1, outputWatts: 11, amplifierClass: 'B' }),
    ],
    ['nothing left to swing', 'saturationVolts', () => loadForPower(10, 10, 5)],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
