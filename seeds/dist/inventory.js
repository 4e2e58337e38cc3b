"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.seedInventory = seedInventory;
const clearances_service_1 = require("@ferrite-row/api/instruments/clearances.service");
const instrument_care_service_1 = require("@ferrite-row/api/instruments/instrument-care.service");
const inventory_service_1 = require("@ferrite-row/api/instruments/inventory.service");
const stage_set_1 = require("./stage-set");
const kind = (name, needsClearance, needsCalibration) => ({
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
];
/** Damage levels and accuracies are those of no maker: common practice for each kind. */
const INSTRUMENTS = [
    { tag: 'FR-014', kind: 'Vector analyzer', dueInDays: 96, damageLevelDbm: 13, amplitudeAccuracyDb: 0.5 },
    { tag: 'FR-021', kind: 'Oscilloscope', dueInDays: 138, damageLevelDbm: 30, amplitudeAccuracyDb: null },
    { tag: 'FR-022', kind: 'Oscilloscope', dueInDays: 88, damageLevelDbm: 30, amplitudeAccuracyDb: null },
    { tag: 'FR-023', kind: 'Oscilloscope', dueInDays: 201, damageLevelDbm: 30, amplitudeAccuracyDb: null },
    { tag: 'FR-031', kind: 'Spectrum analyzer', dueInDays: 55, damageLevelDbm: 20, amplitudeAccuracyDb: 0.8 },
    { tag: 'FR-032', kind: 'Spectrum analyzer', dueInDays: 170, damageLevelDbm: 20, amplitudeAccuracyDb: 0.8 },
    { tag: 'FR-033', kind: 'Frequency counter', dueInDays: 120, damageLevelDbm: 24, amplitudeAccuracyDb: null },
    { tag: 'FR-034', kind: 'Frequency counter', dueInDays: 143, damageLevelDbm: 24, amplitudeAccuracyDb: null },
    { tag: 'FR-040', kind: 'Signal generator', dueInDays: 5, damageLevelDbm: 17, amplitudeAccuracyDb: 0.7 },
    { tag: 'FR-051', kind: 'Multimeter', dueInDays: 174, damageLevelDbm: null, amplitudeAccuracyDb: null },
    { tag: 'FR-054', kind: 'Multimeter', dueInDays: 230, damageLevelDbm: null, amplitudeAccuracyDb: null },
    { tag: 'FR-055', kind: 'Multimeter', dueInDays: 61, damageLevelDbm: null, amplitudeAccuracyDb: null },
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
async function seedInventory(set) {
    const { context, clock, calendar } = set;
    clock.set(calendar.at(calendar.today.subtract({ days: 300 }), 10));
    const service = context.get(inventory_service_1.InventoryService);
    const kinds = await service.enrolKinds(KINDS);
    const kindIds = new Map(kinds.map(({ name, id }) => [name, id]));
    const benches = await service.enrolBenches(BENCHES.map((name, index) => ({ tag: `Bench ${index + 1}`, name })));
    const instruments = await service.enrolInstruments(INSTRUMENTS.map(({ tag, name, kind: kindName, dueInDays, damageLevelDbm, amplitudeAccuracyDb }) => ({
        tag,
        name: name ?? kindName,
        kindId: (0, stage_set_1.found)(kindIds, kindName),
        calibrationDueOn: dueInDays === null ? null : calendar.today.add({ days: dueInDays }).toString(),
        damageLevelDbm,
        amplitudeAccuracyDb,
    })));
    const ids = new Map([...benches, ...instruments].map(({ tag, id }) => [tag, id]));
    const inventory = {
        bench: (number) => (0, stage_set_1.found)(ids, `Bench ${number}`),
        instrument: (tag) => (0, stage_set_1.found)(ids, tag),
        kind: (name) => (0, stage_set_1.found)(kindIds, name),
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
async function seedClearances({ context, clock, calendar, as }, inventory) {
    clock.set(calendar.at(calendar.today.subtract({ days: 200 }), 19));
    const clearances = context.get(clearances_service_1.ClearancesService);
    const grant = (kindName) => async (key) => {
        const until = calendar.today.add({ days: RUNS_OUT.get(key) ?? 285 }).toString();
        await clearances.grant(as('oona'), {
            personId: as(key).personId,
            kindId: inventory.kind(kindName),
            until,
        });
    };
    for (const key of CLEARED_ON_SPECTRUM)
        await grant('Spectrum analyzer')(key);
    for (const key of CLEARED_ON_VECTOR)
        await grant('Vector analyzer')(key);
}
async function seedFault({ context, clock, calendar, as }, inventory) {
    clock.set(calendar.at(calendar.today.subtract({ days: 4 }), 20, 15));
    const note = 'No count under 5 MHz. Waiting on a part.';
    const counter = inventory.instrument('FR-033');
    await context
        .get(instrument_care_service_1.InstrumentCareService)
        .changeCondition(as('oona'), counter, { condition: 'in repair', note });
}
//# sourceMappingURL=inventory.js.map