import { memo, useMemo } from 'react';
import { token } from '../../../shared-ui/tokens';
import type { Curve } from './filters';
import type { Scale } from './scale';

/** One path of straight pieces; two figures after the point are a hundredth of a pixel. */
function lineOf({ hertz, gainDb }: Curve, { x, yOfGain }: Scale): string {
  let path = '';
  for (let index = 0; index < hertz.length; index++) {
    path += `${index === 0 ? 'M' : 'L'}${x(hertz[index]).toFixed(2)} ${yOfGain(gainDb[index]).toFixed(2)}`;
  }
  return path;
}

/** The filter's response on the scale of the levels, with 10 % of its colour under it. */
export const FilterCurve = memo(function FilterCurve({ curve, scale }: { curve: Curve; scale: Scale }) {
  const line = useMemo(() => lineOf(curve, scale), [curve, scale]);
  const { bottom, right, x } = scale;
  return (
    <>
      <path d={`${line}L${right} ${bottom}H${x(curve.hertz[0])}Z`} fill={token('green')} fillOpacity="0.1" />
      <path d={line} fill="none" stroke={token('green')} strokeWidth="2" strokeLinejoin="round" />
    </>
  );
});
