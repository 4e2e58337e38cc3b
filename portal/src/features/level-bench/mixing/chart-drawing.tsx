import { useMemo } from 'react';
import { fixed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import { ChartAxes } from './chart-axes';
import { ChartName } from './chart-name';
import { FilterCurve } from './filter-curve';
import { GoalLine } from './goal-line';
import { goalLabel, namesOf, type ProductMark } from './marks';
import { NamedMark, ThinMarks } from './product-marks';
import { bottomOf, type Scale } from './scale';
import { decibels } from './words';
import type { Mixing } from './work-out';

interface ChartDrawingProps {
  mixing: Mixing;
  scale: Scale;
  named: readonly ProductMark[];
  thin: readonly ProductMark[];
  focused?: ProductMark;
}

function Focus({ mark: { x, yTick, yEnd } }: { mark: ProductMark }) {
  const [top, bottom] = [Math.min(yTick, yEnd) - 7, Math.max(yTick, yEnd) + 9];
  return (
    <rect
      x={x - 10}
      y={top}
      width="20"
      height={bottom - top}
      rx="3"
      fill="none"
      stroke={token('green')}
      strokeWidth="2"
    />
  );
}

/** A focused product that has no name gets one while it is focused. */
const focusName = ({ row, x, yTick }: ProductMark) =>
  ({ text: row.product.name, x, y: yTick - 12, anchor: 'middle', isStrong: true }) as const;

/** The goal's words; none when its line is off the scale. */
function goalOf({ goalDbm, values }: Mixing, scale: Scale) {
  if (goalDbm <= bottomOf(scale) || goalDbm > scale.topDbm) return undefined;
  const goal = `goal, ${decibels(values.goalDb)} below`;
  const text = scale.isPhone ? goal : `${goal} the wanted: ${fixed(goalDbm)} dBm`;
  return goalLabel(text, scale, scale.y(goalDbm));
}

/** All of the picture, back to front. */
export function ChartDrawing({ mixing, scale, named, thin, focused }: ChartDrawingProps) {
  const { bands, band, curve, goalDbm } = mixing;
  const { goal, names } = useMemo(() => {
    const line = goalOf(mixing, scale);
    return { goal: line, names: namesOf(named, scale, line ? [line.box] : []) };
  }, [mixing, named, scale]);
  const isUnnamed = focused && !named.includes(focused);
  return (
    <>
      <ChartAxes {...{ scale, bands, band }} hasFilter={curve !== undefined} />
      {curve && <FilterCurve {...{ curve, scale }} />}
      {goal && <GoalLine {...{ mixing, scale }} y={scale.y(goalDbm)} />}
      <ThinMarks marks={thin} />
      {named.map((mark) => (
        <NamedMark key={mark.row.product.name} mark={mark} />
      ))}
      {goal && <ChartName label={goal} colour="oxide" />}
      {names.map((label) => (
        <ChartName key={label.text} label={label} />
      ))}
      {focused && <Focus mark={focused} />}
      {isUnnamed && <ChartName label={focusName(focused)} />}
    </>
  );
}
