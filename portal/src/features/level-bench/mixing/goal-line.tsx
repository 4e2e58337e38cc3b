import { token } from '../../../shared-ui/tokens';
import { bandWidth } from './band-marks';
import type { Scale } from './scale';
import type { Mixing } from './work-out';

/** Left open on either side of the wanted band, px. */
const AIR = 12;

/** How low everything else must lie, broken where the wanted product is. */
export function GoalLine({ mixing: { band }, scale, y }: { mixing: Mixing; scale: Scale; y: number }) {
  const { left, right, x } = scale;
  const half = bandWidth(band, scale) / 2 + AIR;
  const middle = x((band.lowHertz + band.highHertz) / 2);
  const before = `M${left} ${y}H${Math.max(left, middle - half)}`;
  const after = middle + half < right ? `M${middle + half} ${y}H${right}` : '';
  return <path d={before + after} stroke={token('oxide')} strokeWidth="2" fill="none" />;
}
