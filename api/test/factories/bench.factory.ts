import { randomUUID } from 'node:crypto';
import { InventoryService, type NewInstrument, type NewKind } from '../../src/instruments/inventory.service';
import type { InstrumentKind } from '../../src/instruments/instrument-kind.entity';
import type { Resource } from '../../src/instruments/resource.entity';
import type { TestApp } from '../app';

const some = (): string => randomUUID().slice(0, 8);

/** A bench; every call a new one. */
export async function bench(test: TestApp, tag = `Bench ${some()}`): Promise<Resource> {
  const [made] = await test.app.get(InventoryService).enrolBenches([{ tag, name: 'By the window' }]);
  if (!made) throw new Error('no bench was made');
  return made;
}

/** A kind that anybody may use and that needs no calibration, unless told. */
export async function kind(test: TestApp, overrides: Partial<NewKind> = {}): Promise<InstrumentKind> {
  const plain = { name: `Kind ${some()}`, needsClearance: false, needsCalibration: false };
  const [made] = await test.app.get(InventoryService).enrolKinds([{ ...plain, ...overrides }]);
  if (!made) throw new Error('no kind was made');
  return made;
}

/** An instrument of a kind of its own, ready for anybody, unless told. */
export async function instrument(
  test: TestApp,
  overrides: Partial<NewInstrument> = {},
  ofKind?: Partial<NewKind>,
): Promise<Resource> {
  const kindId = overrides.kindId ?? (await kind(test, ofKind)).id;
  const plain = {
    tag: `FR-${some()}`,
    name: 'Signal generator',
    calibrationDueOn: null,
    damageLevelDbm: null,
    amplitudeAccuracyDb: null,
  };
  const wanted = { ...plain, ...overrides, kindId };
  const [made] = await test.app.get(InventoryService).enrolInstruments([wanted]);
  if (!made) throw new Error('no instrument was made');
  return made;
}

/** The `hours`-th hour of the day after the tests' own, as ISO text: a Friday in winter, when the club keeps UTC. */
export function tomorrowAt(hour: number, minute = 0): string {
  return new Date(Date.UTC(2026, 0, 16, hour, minute)).toISOString();
}
