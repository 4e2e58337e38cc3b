import {
  coupledResonatorBandPass,
  ladderResponse,
  lowPassLadder,
  type BandPassInput,
  type Ladder,
  type PartQ,
} from '@ferrite-row/levels';
import { lastOnly } from './last-only';

/**
 * Band-passes of three resonators for the bands: twice the band's width where that is 4 % of the centre or more, 4 %
 * otherwise, which coils of ordinary Q still stand (common practice).
 */
const BANDS = {
  '80m': { name: '80 m', centreHertz: 3.65e6, bandwidthHertz: 600e3 },
  '40m': { name: '40 m', centreHertz: 7.1e6, bandwidthHertz: 400e3 },
  '30m': { name: '30 m', centreHertz: 10.125e6, bandwidthHertz: 405e3 },
  '20m': { name: '20 m', centreHertz: 14.175e6, bandwidthHertz: 700e3 },
  '17m': { name: '17 m', centreHertz: 18.118e6, bandwidthHertz: 725e3 },
  '15m': { name: '15 m', centreHertz: 21.225e6, bandwidthHertz: 900e3 },
  '12m': { name: '12 m', centreHertz: 24.94e6, bandwidthHertz: 1e6 },
  '10m': { name: '10 m', centreHertz: 28.85e6, bandwidthHertz: 3.4e6 },
} as const;

type BandFilter = keyof typeof BANDS;

export const BAND_FILTERS = Object.entries(BANDS).map(([value, { name }]) => ({
  value: value as BandFilter,
  label: `${name} band-pass, three resonators`,
}));

export const OWN_FILTERS = [
  { value: 'own-band-pass', label: 'Band-pass, your figures' },
  { value: 'own-low-pass', label: 'Low-pass, your figures' },
] as const;

const RESONATORS = 3;
const ENDS = { sourceOhms: 50, loadOhms: 50 } as const;

/** Reactance of a resonator's coil at the centre, ohm: 1 µH on 20 m. */
const COIL_OHMS = 2 * Math.PI * 14.175;

/** A toroid of powdered iron at HF has a Q of 150 to 200, a small capacitor one near 1,000 (common practice). */
const BAND_Q: PartQ = { inductorQ: 165, capacitorQ: 1000 };

interface MixerFilter {
  ladder: Ladder;
  q: PartQ;
  /** Where it is narrow and a curve needs more points, Hz. */
  detail?: { centreHertz: number; bandwidthHertz: number };
}

/** What is said of the filter; each kind reads its own. */
export interface FilterFigures {
  filter: BandFilter | (typeof OWN_FILTERS)[number]['value'] | 'none';
  order: number;
  inductorQ: number;
  centreHertz: number;
  bandwidthHertz: number;
  resonatorHenries: number;
  cutoffHertz: number;
}

type BandPassFigures = Pick<BandPassInput, 'order' | 'centreHertz' | 'bandwidthHertz' | 'resonatorHenries'>;

function bandPass(figures: BandPassFigures, q: PartQ): MixerFilter {
  const { order, centreHertz, bandwidthHertz, resonatorHenries } = figures;
  const band = { centreHertz, bandwidthHertz };
  const shape = { family: 'Butterworth', order, resonatorHenries } as const;
  return { ladder: coupledResonatorBandPass({ ...shape, ...band, ...ENDS }), q, detail: band };
}

function lowPass({ order, cutoffHertz }: FilterFigures, q: PartQ): MixerFilter {
  const shape = { family: 'Butterworth', order, cutoffHertz } as const;
  return { ladder: lowPassLadder({ ...shape, sourceOhms: ENDS.sourceOhms, first: 'shunt' }), q };
}

/**
 * The filter chosen, from its exact parts with their Q: its capacitors are trimmed on the bench. Butterworth throughout.
 * @throws OutOfDomainError naming the input.
 */
export function filterOf(figures: FilterFigures): MixerFilter | undefined {
  const { filter, inductorQ } = figures;
  if (filter === 'none') return undefined;
  if (filter === 'own-low-pass') return lowPass(figures, { ...BAND_Q, inductorQ });
  if (filter === 'own-band-pass') return bandPass(figures, { ...BAND_Q, inductorQ });
  const band = BANDS[filter];
  const resonatorHenries = COIL_OHMS / (2 * Math.PI * band.centreHertz);
  return bandPass({ ...band, resonatorHenries, order: RESONATORS }, BAND_Q);
}

/** No product but one at no frequency at all is under this. */
const LEAST_HERTZ = 1;

/** Gain of a filter at one frequency, dB. */
export const gainOf =
  ({ ladder, q }: MixerFilter) =>
  (hertz: number): number =>
    ladderResponse(ladder, Float64Array.of(Math.max(hertz, LEAST_HERTZ)), q).gainDb[0];

const ALONG = 360;
const IN_DETAIL = 80;
/** On either side of the centre, in bandwidths. */
const DETAIL_REACH = 2;

/** A response to draw, by rising frequency. */
export interface Curve {
  hertz: Float64Array;
  gainDb: Float64Array;
}

/** What to draw of a filter: the response from 0 to the end of the axis; none where there is no filter. */
export const curveOf = lastOnly(
  ({ figures, maxHertz }: { figures: FilterFigures; maxHertz: number }): Curve | undefined => {
    const filter = filterOf(figures);
    return filter && responseOf(filter, maxHertz);
  },
);

/** With more points where it is steep. */
function responseOf({ ladder, q, detail }: MixerFilter, maxHertz: number): Curve {
  const along = Array.from({ length: ALONG }, (_one, index) => (maxHertz * (index + 0.5)) / ALONG);
  const inside = [...along, maxHertz, ...finePoints(detail)].filter((at) => at > 0 && at <= maxHertz);
  const hertz = Float64Array.from(inside).sort();
  return { hertz, gainDb: ladderResponse(ladder, hertz, q).gainDb };
}

function finePoints(detail: MixerFilter['detail']): number[] {
  if (!detail) return [];
  const from = detail.centreHertz - DETAIL_REACH * detail.bandwidthHertz;
  const step = (2 * DETAIL_REACH * detail.bandwidthHertz) / (IN_DETAIL - 1);
  return Array.from({ length: IN_DETAIL }, (_one, index) => from + index * step);
}
