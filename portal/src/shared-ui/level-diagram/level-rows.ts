import type { Verdict } from '../states/state-words';
import type { LevelBeingEntered, LevelPoint, MeasuredLevel } from './level-point';

/** Below this the headroom that was measured is called low (common practice). */
const LOW_HEADROOM_DB = 1;

/** Everything the drawing, its table and the spoken sentence say about one point: one source, so they cannot differ. */
export interface LevelRow {
  point: LevelPoint;
  measured: MeasuredLevel | undefined;
  isBeingEntered: boolean;
  offPlanDb: number | undefined;
  /** From the point before; undefined for the first. */
  gainPlannedDb: number | undefined;
  /** Undefined until both this point and the one before are measured. */
  gainMeasuredDb: number | undefined;
  /** From the planned level to the limit; undefined without a limit. */
  headroomDb: number | undefined;
  isHeadroomLow: boolean;
  verdict: Verdict | undefined;
}

const difference = (a: number | undefined, b: number | undefined): number | undefined =>
  a === undefined || b === undefined ? undefined : a - b;

export function levelRows(points: readonly LevelPoint[], entered?: LevelBeingEntered): LevelRow[] {
  const measuredAt = (index: number): MeasuredLevel | undefined => {
    const point = points[index];
    return entered && entered.pointId === point?.id ? entered : (point?.measured ?? undefined);
  };
  return points.map((point, index) => {
    const before = index > 0 ? points[index - 1] : undefined;
    const measured = measuredAt(index);
    const isBeingEntered = entered?.pointId === point.id;
    const limit = point.limitDbm ?? undefined;
    const measuredHeadroom = difference(limit, measured?.levelDbm);
    return {
      point,
      measured,
      isBeingEntered,
      offPlanDb: difference(measured?.levelDbm, point.planDbm),
      gainPlannedDb: difference(point.planDbm, before?.planDbm),
      gainMeasuredDb: before && difference(measured?.levelDbm, measuredAt(index - 1)?.levelDbm),
      headroomDb: difference(limit, point.planDbm),
      isHeadroomLow: measuredHeadroom !== undefined && measuredHeadroom < LOW_HEADROOM_DB,
      verdict: (isBeingEntered ? entered?.verdict : point.verdict) ?? undefined,
    };
  });
}
