import { steps } from './plot-scale';
import type { FilterBuilds } from './builds';
import type { FilterFigures } from './figures';
import { nearestIndex } from './frequencies';
import type { Judged, JudgedLimit } from './judged';

/** The response at one frequency. */
export interface ResponseRow {
  hertz: number;
  gainDb: number;
  returnLossDb: number;
  /** Between these lie 95 % of the builds. */
  gainFromDb?: number;
  gainToDb?: number;
  returnFromDb?: number;
  returnToDb?: number;
  limit?: JudgedLimit;
}

/** What the plot shows at the point nearest to a frequency. */
export function rowAt(
  { response }: FilterFigures,
  { limits }: Judged,
  built: FilterBuilds | undefined,
  hertz: number,
): ResponseRow {
  const index = nearestIndex(response.hertz, hertz);
  const at = response.hertz[index] ?? hertz;
  const row: ResponseRow = {
    hertz: at,
    gainDb: response.gainDb[index],
    returnLossDb: response.returnLossDb[index],
    limit: limits.find((one) => one.hertz === at),
  };
  // Builds of another filter, still on its way, were looked at elsewhere.
  if (built?.bands.hertz[index] !== at) return row;
  const [gainFrom, gainTo] = built.bands.gainDb;
  const [returnFrom, returnTo] = built.bands.returnLossDb;
  return {
    ...row,
    gainFromDb: gainFrom?.[index],
    gainToDb: gainTo?.[index],
    returnFromDb: returnFrom?.[index],
    returnToDb: returnTo?.[index],
  };
}

/** The table's rows: every half step, both ends of the band, and the limits. */
export function responseRows(
  figures: FilterFigures,
  judged: Judged,
  built: FilterBuilds | undefined,
): ResponseRow[] {
  const { axis, carrier, limits } = figures;
  const wanted = [
    ...steps(axis.stepHertz / 2, axis.endHertz).slice(1),
    carrier.lowHertz,
    carrier.highHertz,
    ...limits.map(({ hertz }) => hertz).filter((hertz) => hertz <= axis.endHertz),
  ];
  return [...new Set(wanted)].sort((a, b) => a - b).map((hertz) => rowAt(figures, judged, built, hertz));
}

/** The next stop of the keyboard on the plot: along the steps, or to the next limit. */
export function nextStop(
  { axis, limits }: Pick<FilterFigures, 'axis' | 'limits'>,
  at: number | undefined,
  key: string,
  isFine: boolean,
): number | undefined {
  const step = isFine ? axis.stepHertz / 10 : axis.stepHertz;
  const held = (hertz: number) => Math.min(Math.max(hertz, axis.stepHertz / 10), axis.endHertz);
  // A hair over, so that a stop that is on a step counts as on it.
  const places = (at ?? 0) / step;
  if (key === 'ArrowRight') return held((Math.floor(places + 1e-6) + 1) * step);
  if (key === 'ArrowLeft') return held((Math.ceil(places - 1e-6) - 1) * step);
  if (key === 'Home') return held(0);
  if (key === 'End') return axis.endHertz;
  if (key.toLowerCase() !== 'h') return undefined;
  const stops = limits.map(({ hertz }) => hertz).filter((hertz) => hertz <= axis.endHertz);
  return stops.find((hertz) => hertz > (at ?? 0)) ?? stops[0];
}
