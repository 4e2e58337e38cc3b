import {
  bandsOf,
  checkEmission,
  formatQuantity,
  occupiedBand,
  type EmissionCheck,
  type OccupiedBand,
} from '@ferrite-row/levels';
import { fixed } from '../../../lib/text';
import type { GuardValues } from './inputs';
import type { Judged, JudgedFigure, JudgedTable } from './judged';
import { ruleSetOf, sourceOf } from './rule-set';

const megahertz = (hertz: number): string => fixed(hertz / 1e6, 4);

/** The occupied frequencies, and the band they lie in or next to. */
export interface BandPicture extends OccupiedBand {
  carrierHertz: number;
  band?: { name: string; lowHertz: number; highHertz: number };
}

function nearestBand({ ruleSet, day, region }: GuardValues, occupied: OccupiedBand): BandPicture['band'] {
  const set = ruleSetOf(ruleSet);
  const bands = bandsOf(set, day, set.regions.length > 1 ? Number(region) : undefined);
  const away = (band: { lowHertz: number; highHertz: number }) =>
    Math.max(band.lowHertz - occupied.highHertz, occupied.lowHertz - band.highHertz, 0);
  const [nearest] = [...bands].sort((a, b) => away(a) - away(b));
  return nearest && { name: nearest.band, lowHertz: nearest.lowHertz, highHertz: nearest.highHertz };
}

function powerFigure({ limits }: EmissionCheck): JudgedFigure {
  const [first] = limits;
  if (!first) return { name: 'Power', figure: 'No limit here', words: 'in this set; your licence has one' };
  const { kind, limitWatts, watts, isOver } = first;
  return {
    name: `Power, ${kind}, at most`,
    figure: formatQuantity(limitWatts, 'W'),
    words: watts === undefined ? undefined : `it is ${formatQuantity(watts, 'W')}`,
    tone: isOver ? 'caution' : 'plain',
  };
}

const limitsTable = ({ limits }: EmissionCheck): JudgedTable => ({
  title: 'Limits of power here',
  heads: ['Kind', 'At most', 'It is', 'Clause'],
  rows: limits.map(({ kind, limitWatts, watts, rule, isOver }) => ({
    cells: [
      kind,
      formatQuantity(limitWatts, 'W'),
      watts === undefined ? '' : `${formatQuantity(watts, 'W')}${isOver ? ', over' : ''}`,
      rule,
    ],
  })),
  none: 'None in this set.',
});

function askedOf(values: GuardValues) {
  const { ruleSet: id, licenceClass, emission, day, region, peakWatts, feedLossDb, antennaGainDbd } = values;
  const ruleSet = ruleSetOf(id);
  const occupied = occupiedBand(values.carrierHertz, values.side, values.bandwidthHertz);
  return {
    ...{ ruleSet, emission, day, peakWatts, feedLossDb, antennaGainDbd, ...occupied },
    ...(ruleSet.licenceClasses.length > 0 && { licenceClass }),
    ...(ruleSet.regions.length > 1 && { region: Number(region) }),
  };
}

/** An emission with all it occupies against band, class, kind, width and power. */
export function judgeBand(values: GuardValues): Judged & { picture: BandPicture } {
  const asked = askedOf(values);
  const { lowHertz, highHertz, ruleSet } = asked;
  const check = checkEmission(asked);
  const isPlan = ruleSet.kind === 'band plan';
  return {
    figures: [
      {
        name: 'It occupies, MHz',
        figure: `${megahertz(lowHertz)} to ${megahertz(highHertz)}`,
        words: check.band === undefined ? 'in no band of this set' : `${check.band} band`,
      },
      {
        name: isPlan ? 'Against the plan' : 'Against the rules',
        figure: check.fits ? 'Nothing against it' : 'Not here',
        words: check.fits ? 'in this set; your licence decides' : check.reasons[0]?.text,
        tone: check.fits ? 'plain' : 'caution',
      },
      powerFigure(check),
    ],
    tables: [
      {
        title: 'Against it',
        heads: ['Reason', 'Clause'],
        rows: check.reasons.map(({ text, rule }) => ({ cells: [text, rule] })),
        none: 'Nothing in this set.',
      },
      limitsTable(check),
      ...(check.notes.length > 0
        ? [{ title: 'To know here', heads: ['Note'], rows: check.notes.map((note) => ({ cells: [note] })) }]
        : []),
    ],
    source: sourceOf(ruleSet),
    caution: { kind: 'licence needed', words: check.caution },
    picture: { lowHertz, highHertz, carrierHertz: values.carrierHertz, band: nearestBand(values, asked) },
  };
}
