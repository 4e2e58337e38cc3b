import type { ChannelRow } from '../rule-sets/rule-set';
import { applies } from './asked';
import type { Asked } from './asked';
import { radiatedPower } from './radiated-power';
import { overlaps } from './spans';

/** A limit of power, and how the emission stands to it. */
export interface PowerLimit {
  /** Peak envelope power of the transmitter, or effective radiated power against a half-wave dipole. */
  kind: 'PEP' | 'ERP';
  limitWatts: number;
  rule: string;
  /** Absent while no power is given. */
  watts?: number;
  isOver: boolean;
}

/** The limits that apply where an emission lies: the lowest of each kind. */
export function powerLimits(asked: Asked, channel?: ChannelRow): PowerLimit[] {
  const rows = asked.ruleSet.power.filter((row) => applies(row, asked) && overlaps(row.span, asked.span));
  const peak = rows.flatMap(({ peakWatts, rule }) =>
    peakWatts === undefined ? [] : [{ limitWatts: peakWatts, rule }],
  );
  // On a channel its own limit takes the place of the segment's around it.
  const erp =
    channel === undefined
      ? rows.flatMap(({ erpWatts, rule }) => (erpWatts === undefined ? [] : [{ limitWatts: erpWatts, rule }]))
      : [{ limitWatts: channel.erpWatts, rule: channel.rule }];
  const radiated = asked.peakWatts === undefined ? undefined : radiatedPower(asked);
  return [...lowest('PEP', peak, asked.peakWatts), ...lowest('ERP', erp, radiated?.erpWatts)];
}

function lowest(
  kind: PowerLimit['kind'],
  limits: readonly Pick<PowerLimit, 'limitWatts' | 'rule'>[],
  watts: number | undefined,
): PowerLimit[] {
  const [first] = [...limits].sort((a, b) => a.limitWatts - b.limitWatts);
  if (first === undefined) return [];
  return [{ kind, ...first, watts, isOver: watts !== undefined && watts > first.limitWatts * (1 + 1e-9) }];
}
