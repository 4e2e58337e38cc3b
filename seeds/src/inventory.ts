import { ClearancesService } from '@ferrite-row/api/instruments/clearances.service';
import { InstrumentCareService } from '@ferrite-row/api/instruments/instrument-care.service';
import { InventoryService } from '@ferrite-row/api/instruments/inventory.service';
import { DETECTOR } from './detector';
import { found, type Inventory, type StageSet } from './stage-set';

interface DemoKind {
  name: string;
  needsClearance: boolean;
  needsCalibration: boolean;
}

const kind = (name: string, needsClearance: boolean, needsCalibration: boolean): DemoKind => ({
  name,
  needsClearance,
  needsCalibration,
});

const KINDS = [
  kind('Oscilloscope', false, true),
  kind('Spectrum analyzer', true, true),
  kind('Vector analyzer', true, true),
  kind('Signal generator', false, true),
  kind('Frequency counter', false, true),
  kind('Multimeter', false, true),
  kind('Power attenuator', false, false),
  kind('Dummy load and wattmeter', false, false),
  kind('Log detector', false, true),
];

interface DemoInstrument {
  tag: string;
  kind: string;
  name?: string;
  /** Days from today until its calibration runs out. */
  dueInDays: number | null;
  damageLevelDbm: number | null;
  amplitudeAccuracyDb: number | null;
  /** What else its sheet says, by the name the levels package has for it. */
  figures?: Readonly<Record<string, number>>;
}

/** A digital oscilloscope keeps time by a crystal; the oldest one does not. Gains within 3 %: common practice. */
const DIGITAL_SCOPE = { verticalGainToleranceRel: 0.03, timeBaseToleranceRel: 0.0001 };
const OLD_SCOPE = { verticalGainToleranceRel: 0.03, timeBaseToleranceRel: 0.03 };
const ANALYZER = { scaleFidelityDb: 0.4, flatnessDb: 0.7 };
const COUNTER = { timeBasePpm: 0.5 };
const METER = { accuracyRel: 0.008 };
/** A detector fitted to its line with the club's generator: within half a decibel, common practice. */
const LOG_DETECTOR = { ...DETECTOR, conformityDb: 0.5, accuracyRel: 0.003 };

/** Damage levels and accuracies are those of no maker: common practice for each kind. */
const INSTRUMENTS: readonly DemoInstrument[] = [
  { tag: 'FR-014', kind: 'Vector analyzer', dueInDays: 96, damageLevelDbm: 13, amplitudeAccuracyDb: 0.5 },
  {
    tag: 'FR-021',
    kind: 'Oscilloscope',
    dueInDays: 138,
    damageLevelDbm: 30,
    amplitudeAccuracyDb: null,
    figures: DIGITAL_SCOPE,
  },
  {
    tag: 'FR-022',
    kind: 'Oscilloscope',
    dueInDays: 88,
    damageLevelDbm: 30,
    amplitudeAccuracyDb: null,
    figures: DIGITAL_SCOPE,
  },
  {
    tag: 'FR-023',
    kind: 'Oscilloscope',
    dueInDays: 201,
    damageLevelDbm: 30,
    amplitudeAccuracyDb: null,
    figures: OLD_SCOPE,
  },
  {
    tag: 'FR-031',
    kind: 'Spectrum analyzer',
    dueInDays: 55,
    damageLevelDbm: 20,
    amplitudeAccuracyDb: 0.8,
    figures: ANALYZER,
  },
  {
    tag: 'FR-032',
    kind: 'Spectrum analyzer',
    dueInDays: 170,
    damageLevelDbm: 20,
    amplitudeAccuracyDb: 0.8,
    figures: ANALYZER,
  },
  {
    tag: 'FR-033',
    kind: 'Frequency counter',
    dueInDays: 120,
    damageLevelDbm: 24,
    amplitudeAccuracyDb: null,
    figures: COUNTER,
  },
  {
    tag: 'FR-034',
    kind: 'Frequency counter',
    dueInDays: 143,
    damageLevelDbm: 24,
    amplitudeAccuracyDb: null,
    figures: COUNTER,
  },
  { tag: 'FR-040', kind: 'Signal generator', dueInDays: 5, damageLevelDbm: 17, amplitudeAccuracyDb: 0.7 },
  {
    tag: 'FR-041',
    kind: 'Log detector',
    dueInDays: 77,
    damageLevelDbm: 15,
    amplitudeAccuracyDb: null,
    figures: LOG_DETECTOR,
  },
  {
    tag: 'FR-051',
    kind: 'Multimeter',
    dueInDays: 174,
    damageLevelDbm: null,
    amplitudeAccuracyDb: null,
    figures: METER,
  },
  {
    tag: 'FR-054',
    kind: 'Multimeter',
    dueInDays: 230,
    damageLevelDbm: null,
    amplitudeAccuracyDb: null,
    figures: METER,
  },
  {
    tag: 'FR-055',
    kind: 'Multimeter',
    dueInDays: 61,
    damageLevelDbm: null,
    amplitudeAccuracyDb: null,
    figures: METER,
  },
  {
    tag: 'FR-052',
    kind: 'Power attenuator',
    name: 'Pad, 20 dB',
    dueInDays: null,
    damageLevelDbm: 37,
    amplitudeAccuracyDb: 0.3,
  },
  {
    tag: 'FR-060',
    kind: 'Dummy load and wattmeter',
    name: 'Dummy load with tap',
    dueInDays: null,
    damageLevelDbm: 44,
    amplitudeAccuracyDb: 0.3,
  },
];

const BENCHES = [
  'By the window',
  'Under the clock',
  'Middle row',
  'Power bench',
  'Long bench',
  'By the store',
];

/** Benches, instruments and who is cleared on what; then what has gone wrong with one of them. */
export async function seedInventory(set: StageSet): Promise<Inventory> {
  const { context, clock, calendar } = set;
  clock.set(calendar.at(calendar.today.subtract({ days: 300 }), 10));
  const service = context.get(InventoryService);
  const kinds = await service.enrolKinds(KINDS);
  const kindIds = new Map(kinds.map(({ name, id }) => [name, id]));
  const benches = await service.enrolBenches(
    BENCHES.map((name, index) => ({ tag: `Bench ${index + 1}`, name })),
  );
  const instruments = await service.enrolInstruments(
    INSTRUMENTS.map(
      ({ tag, name, kind: kindName, dueInDays, damageLevelDbm, amplitudeAccuracyDb, figures }) => ({
        ...{ tag, figures },
        name: name ?? kindName,
        kindId: found(kindIds, kindName),
        calibrationDueOn: dueInDays === null ? null : calendar.today.add({ days: dueInDays }).toString(),
        damageLevelDbm,
        amplitudeAccuracyDb,
      }),
    ),
  );
  const ids = new Map([...benches, ...instruments].map(({ tag, id }) => [tag, id]));
  const inventory: Inventory = {
    bench: (number) => found(ids, `Bench ${number}`),
    instrument: (tag) => found(ids, tag),
    kind: (name) => found(kindIds, name),
  };
  await seedClearances(set, inventory);
  await seedFault(set, inventory);
  return inventory;
}

const CLEARED_ON_SPECTRUM = [
  'tamsin',
  'lena',
  'hollis',
  'greta',
  'oona',
  'marek',
  'noor',
  'priya',
  'kofi',
  'bea',
  'jonty',
  'orla',
  'petra',
  'mairi',
  'idris',
  'ansel',
];
const CLEARED_ON_VECTOR = ['hollis', 'greta', 'oona', 'jonty', 'noor', 'marek', 'orla'];
/** Days from today; the rest are cleared for the winter. */
const RUNS_OUT = new Map([['kofi', 6]]);

async function seedClearances(
  { context, clock, calendar, as }: StageSet,
  inventory: Inventory,
): Promise<void> {
  clock.set(calendar.at(calendar.today.subtract({ days: 200 }), 19));
  const clearances = context.get(ClearancesService);
  const grant =
    (kindName: string) =>
    async (key: string): Promise<void> => {
      const until = calendar.today.add({ days: RUNS_OUT.get(key) ?? 285 }).toString();
      await clearances.grant(as('oona'), {
        personId: as(key).personId,
        kindId: inventory.kind(kindName),
        until,
      });
    };
  for (const key of CLEARED_ON_SPECTRUM) await grant('Spectrum analyzer')(key);
  for (const key of CLEARED_ON_VECTOR) await grant('Vector analyzer')(key);
}

async function seedFault({ context, clock, calendar, as }: StageSet, inventory: Inventory): Promise<void> {
  clock.set(calendar.at(calendar.today.subtract({ days: 4 }), 20, 15));
  const note = 'No count under 5 MHz. Waiting on a part.';
  const counter = inventory.instrument('FR-033');
  await context
    .get(InstrumentCareService)
    .changeCondition(as('oona'), counter, { condition: 'in repair', note });
}
