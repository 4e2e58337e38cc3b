import { dBm, ENTRY_METHODS, methodGives, wattsFromDbm, type EntryMethod } from '@ferrite-row/levels';
import { isDerived, type PlanDescription } from './plan-description';
import {
  placedChecks,
  placedMeasures,
  placedPoints,
  type PlacedMeasure,
  type PlacedPoint,
} from './plan-parts';

/** Two things in a plan that do not meet: where, and with which numbers. */
export interface Disagreement {
  /** A path into the description: `stages.8.checks.3`. */
  path: string;
  detail: string;
}

/** Closer than any level here is planned or read. */
const SAME_DB = 0.05;

/** From here on a stage can burn: the design's caution for RF power begins at one watt. */
const RF_POWER_WATTS = 1;

/**
 * Everything in a plan that does not meet: levels, windows and limits from stage to stage. Empty when it may be published.
 */
export function disagreementsOf(plan: PlanDescription): Disagreement[] {
  return [
    ...repeated(plan),
    ...shapes(plan),
    ...placedMeasures(plan).flatMap((check) => methodAndWindow(check)),
    ...pointsAndLimits(plan),
    ...levelWindows(plan),
    ...workedOut(plan),
    ...cautions(plan),
  ];
}

function repeated(plan: PlanDescription): Disagreement[] {
  const keys = placedChecks(plan).map(({ check, path }) => ({ name: check.key, path }));
  const points = placedPoints(plan).map(({ testPoint, path }) => ({ name: testPoint, path }));
  return [keys, points].flatMap((named) =>
    named
      .filter(({ name }, index) => named.findIndex((other) => other.name === name) !== index)
      .map(({ name, path }) => ({ path, detail: `${name} stands in the plan twice.` })),
  );
}

function shapes(plan: PlanDescription): Disagreement[] {
  const empty = plan.stages
    .map(({ checks, name }, index) => ({ checks, path: `stages.${index}`, name }))
    .filter(({ checks }) => checks.length === 0)
    .map(({ path, name }) => ({ path, detail: `${name} has no checks, so nothing could be signed off.` }));
  const wrong = placedChecks(plan)
    .filter(({ check }) => (check.kind === 'measure') !== (check.measure !== undefined))
    .map(({ check, path }) => ({ path, detail: `${check.title} is to be measured, or it is not.` }));
  return [...empty, ...wrong];
}

function methodAndWindow({ path, title, measure }: PlacedMeasure): Disagreement[] {
  const { method, unit, window, target } = measure;
  const found: Disagreement[] = [];
  const { low = -Infinity, high = Infinity } = window;
  if (window.low === undefined && window.high === undefined)
    found.push({ path, detail: `${title} has no window, so no reading of it could pass.` });
  if (!(low < high)) found.push({ path, detail: `The window of ${title} is reversed or empty.` });
  if (target !== undefined && !(target >= low && target <= high))
    found.push({ path, detail: `${title} aims at ${target}, outside its own window.` });
  if (isEntryMethod(method) && !methodGives(method, unit))
    found.push({ path, detail: `${title}: the ${method} does not give ${unit}.` });
  return found;
}

function isEntryMethod(method: string): method is EntryMethod {
  return ENTRY_METHODS.some((known) => known === method);
}

/** A limit stands above the highest level its own stage may put out, and each point is measured exactly once. */
function pointsAndLimits(plan: PlanDescription): Disagreement[] {
  const measures = placedMeasures(plan);
  return placedPoints(plan).flatMap((point) => {
    const { path, name, plannedDbm, toleranceDb, limitDbm = Infinity, testPoint, stage } = point;
    const found: Disagreement[] = [];
    if (plannedDbm + toleranceDb > limitDbm)
      found.push({
        path,
        detail: `${name} may reach ${plannedDbm + toleranceDb} dBm, over its limit ${limitDbm}.`,
      });
    const here = measures.filter(({ measure }) => measure.levelPoint === testPoint);
    if (here.length !== 1 || here[0]?.stage !== stage)
      found.push({ path, detail: `${testPoint} needs one check of its own stage that measures it.` });
    return found;
  });
}

/** A level's window is its planned level ± tolerance, and it ends below the limit. */
function levelWindows(plan: PlanDescription): Disagreement[] {
  const points = new Map(placedPoints(plan).map((point) => [point.testPoint, point]));
  return placedMeasures(plan).flatMap(({ path, title, measure }) => {
    const { levelPoint, unit, window } = measure;
    if (levelPoint === undefined) return [];
    const point = points.get(levelPoint);
    if (!point) return [{ path, detail: `${title} measures ${levelPoint}, which the plan does not have.` }];
    if (unit !== 'dBm') return [{ path, detail: `${title} measures ${levelPoint}, so its unit is dBm.` }];
    const { plannedDbm, toleranceDb, limitDbm = Infinity } = point;
    const [low, high] = [plannedDbm - toleranceDb, plannedDbm + toleranceDb];
    const isSame = near(window.low, low) && near(window.high, high);
    if (!isSame) return [{ path, detail: `${title}: ${levelPoint} is planned from ${low} to ${high} dBm.` }];
    const reach = window.high ?? Infinity;
    if (reach > limitDbm)
      return [{ path, detail: `${title} permits ${reach} dBm, over the limit ${limitDbm}.` }];
    return [];
  });
}

/** What works itself out fits what it is made of: a gain its two levels, a carried level the stage before. */
function workedOut(plan: PlanDescription): Disagreement[] {
  const measures = placedMeasures(plan);
  const points = placedPoints(plan);
  return measures.flatMap((check) => {
    const { measure, path, title, order } = check;
    const { method, from = [] } = measure;
    if (!isDerived(method)) {
      return from.length > 0
        ? [{ path, detail: `${title} is typed, so it is not made of other checks.` }]
        : [];
    }
    const sources = from.map((key) => measures.find((other) => other.key === key));
    const known = sources.filter((source) => source !== undefined);
    const wanted = method === 'gain' ? 2 : 1;
    if (known.length !== wanted || from.length !== wanted)
      return [
        { path, detail: `${title} is made of ${wanted} measured ${wanted === 1 ? 'check' : 'checks'}.` },
      ];
    if (known.some((source) => source.order >= order))
      return [{ path, detail: `${title} is made of checks that come before it.` }];
    return method === 'gain' ? gainMeets(check, known, points, measures) : carriedMeets(check, known[0]);
  });
}

function carriedMeets(check: PlacedMeasure, source?: PlacedMeasure): Disagreement[] {
  if (!source) return [];
  const { path, title, measure, stage } = check;
  const [own, there] = [measure.window, source.measure.window];
  if (source.stage >= stage) return [{ path, detail: `${title} is carried over from an earlier stage.` }];
  if (source.measure.unit !== measure.unit)
    return [{ path, detail: `${title} changes its unit on the way.` }];
  if (near(own.low, there.low) && near(own.high, there.high)) return [];
  const detail = `${title} takes ${range(own)}, but ${source.title} gives ${range(there)} ${measure.unit}.`;
  return [{ path, detail }];
}

/** Output and input are neighbours on the signal path, and the planned gain is the step between them. */
function gainMeets(
  { path, title, measure }: PlacedMeasure,
  [output, input]: PlacedMeasure[],
  points: readonly PlacedPoint[],
  measures: readonly PlacedMeasure[],
): Disagreement[] {
  if (!output || !input) return [];
  if (measure.unit !== 'dB') return [{ path, detail: `${title} is a gain, so its unit is dB.` }];
  const pointOf = (check: PlacedMeasure): PlacedPoint | undefined =>
    points.find(({ testPoint }) => testPoint === originOf(check, measures).measure.levelPoint);
  const [after, before] = [pointOf(output), pointOf(input)];
  if (!after || !before || after.order !== before.order + 1)
    return [{ path, detail: `${title} is the step between two level points that follow each other.` }];
  const step = after.plannedDbm - before.plannedDbm;
  if (near(measure.target, step)) return [];
  return [
    { path, detail: `${title} aims at ${measure.target ?? 'nothing'}, the levels step by ${step} dB.` },
  ];
}

/** Where a carried value was measured. */
function originOf(check: PlacedMeasure, measures: readonly PlacedMeasure[]): PlacedMeasure {
  const [key] = check.measure.from ?? [];
  const source = check.measure.method === 'carried' && measures.find((other) => other.key === key);
  return source && source.order < check.order ? originOf(source, measures) : check;
}

/** A stage that drives a watt or more says so, and asks for a safety check. */
function cautions(plan: PlanDescription): Disagreement[] {
  return plan.stages.flatMap(({ name, cautions: said = [], levelPoints = [], checks }, index) => {
    const path = `stages.${index}`;
    const isStrong = levelPoints.some(({ plannedDbm }) => wattsFromDbm(dBm(plannedDbm)) >= RF_POWER_WATTS);
    const found: Disagreement[] = [];
    if (isStrong && !(said.includes('rf power') && said.includes('load before power')))
      found.push({ path, detail: `${name} drives a watt or more and has to warn of it.` });
    if (said.length > 0 && !checks.some(({ kind }) => kind === 'safety'))
      found.push({ path, detail: `${name} has cautions but no safety check to acknowledge them.` });
    return found;
  });
}

function near(one: number | undefined, other: number | undefined): boolean {
  if (one === undefined || other === undefined) return one === other;
  return Math.abs(one - other) <= SAME_DB;
}

function range({ low, high }: { low?: number; high?: number }): string {
  return `${low ?? 'anything'} to ${high ?? 'anything'}`;
}
