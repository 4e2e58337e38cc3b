import { applies, requireAsked } from './asked';
import type { Asked, EmissionInput } from './asked';
import { bandReasons } from './emission-reasons';
import type { EmissionReason } from './emission-reasons';
import type { ChannelRow } from '../rule-sets/rule-set';
import { powerLimits } from './power-limits';
import type { PowerLimit } from './power-limits';
import { contains, overlaps } from './spans';

/** Whether an emission fits a rule set. It never says that one may transmit: see the caution. */
export interface EmissionCheck {
  fits: boolean;
  band?: string;
  reasons: EmissionReason[];
  /** Limits of power that apply here, the strictest of each kind. */
  limits: PowerLimit[];
  notes: string[];
  caution: string;
}

/**
 * Checks an emission, with all it occupies, against a rule set: band, licence class, kind, width and power.
 *
 * @throws OutOfDomainError naming the input: a class, kind or region the set does not know, a day before it begins.
 * @example checkEmission({ ruleSet: US_97, licenceClass: 'extra', emission: 'phone', day: '2026-12-01', lowHertz: 14.348e6, highHertz: 14.351e6 }).reasons.map(({ kind, outsideHertz }) => [kind, outsideHertz]) //=> [['outside', 1000]]
 * @example checkEmission({ ruleSet: US_97, licenceClass: 'general', emission: 'data', day: '2026-12-01', lowHertz: 14.1472e6, highHertz: 14.15e6 }).fits //=> true
 * @see the rule set's own source; every reason names its clause
 */
export function checkEmission(input: EmissionInput): EmissionCheck {
  const asked = requireAsked(input);
  const channel = channelOf(asked);
  const reasons = channel === undefined ? bandReasons(asked) : [];
  const limits = powerLimits(asked, channel);
  const powerReasons = limits.filter(({ isOver }) => isOver).map(overPower);
  const all = [...reasons, ...powerReasons];
  const { ruleSet, span } = asked;
  return {
    fits: all.length === 0,
    band: channel?.band ?? bandNameOf(asked),
    reasons: all,
    limits,
    notes: ruleSet.notes
      .filter((note) => overlaps(note.span, span))
      .map((note) => `${note.text} (${note.rule})`),
    caution: ruleSet.caution,
  };
}

/** A carrier keyed on and off must stand in the middle; how near is not said, so within what a dial shows. */
const CARRIER_OFF_CENTRE_KHZ = 0.05;

function channelOf(asked: Asked): ChannelRow | undefined {
  const { span, emission, ruleSet } = asked;
  return ruleSet.channels
    .filter((channel) => applies(channel, asked) && channel.emissions.includes(emission))
    .find(({ centresKilohertz, widestHertz }) => {
      const half = widestHertz / 2000;
      return centresKilohertz.some((centre) => {
        const off = Math.abs((span[0] + span[1]) / 2 - centre);
        const isCentred = emission !== 'CW' || off <= CARRIER_OFF_CENTRE_KHZ;
        return isCentred && contains([centre - half, centre + half], span);
      });
    });
}

function bandNameOf(asked: Asked): string | undefined {
  const { ruleSet, span } = asked;
  return ruleSet.bands.find((row) => row.spans.some((band) => overlaps(band, span)))?.band;
}

function overPower({ kind, watts, limitWatts, rule }: PowerLimit): EmissionReason {
  const text = `At most ${limitWatts} W ${kind} here; it is ${Number((watts ?? NaN).toPrecision(4))} W.`;
  return { kind: 'too much power', text, rule };
}
