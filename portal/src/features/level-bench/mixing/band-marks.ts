import type { AmateurBand } from '@ferrite-row/levels';
import type { Scale } from './scale';

interface BandMark {
  /** '20', without its metres. */
  name: string;
  at: number;
  width: number;
  isWanted: boolean;
  isNamed: boolean;
}

const NARROWEST = 4;
/** Room a name takes, and some air. */
const NAME = 19;

const middle = ({ lowHertz, highHertz }: AmateurBand): number => (lowHertz + highHertz) / 2;

export const bandWidth = ({ lowHertz, highHertz }: AmateurBand, { x }: Scale): number =>
  Math.max(x(highHertz) - x(lowHertz), NARROWEST);

/** Bands under the axis; where names would meet, the wanted band keeps its own, then the wider one. */
export function bandMarks(bands: readonly AmateurBand[], wanted: AmateurBand, scale: Scale): BandMark[] {
  const shown = bands.filter((band) => middle(band) <= scale.maxHertz);
  const byRank = [...shown].sort(
    (a, b) =>
      Number(b === wanted) - Number(a === wanted) ||
      b.highHertz - b.lowHertz - (a.highHertz - a.lowHertz) ||
      a.lowHertz - b.lowHertz,
  );
  const named: AmateurBand[] = [];
  for (const band of byRank) {
    const at = scale.x(middle(band));
    const isFree = named.every((other) => Math.abs(scale.x(middle(other)) - at) >= NAME);
    if (isFree) named.push(band);
  }
  return shown.map((band) => ({
    name: band.band.replace(/ m$/, ''),
    at: scale.x(middle(band)),
    width: bandWidth(band, scale),
    isWanted: band === wanted,
    isNamed: named.includes(band),
  }));
}
