import type { PadPoint } from '@ferrite-row/levels';
import { token } from '../../../shared-ui/tokens';
import { Branch, halfBreadth, type Arrangement, type Box } from './branch';

/** One resistor of a pad's drawing; its two points decide where it is drawn. */
export interface DrawnResistor {
  name: string;
  from: PadPoint;
  to: PadPoint;
  /** Written at it: '300', '300 ohm'. */
  value: string;
  /** Two parts are drawn as two. */
  arrangement?: Arrangement;
}

/** Where the pad's points are. */
export interface PadFrame {
  width: number;
  height: number;
  /** Of the line from in to out, and of the bridge over it; the same where there is none. */
  line: number;
  bridge: number;
  points: Record<Exclude<PadPoint, 'ground'>, number>;
  box: Box;
}

/** From in to out: the bridge, where there is something under it. */
export const isAcross = ({ from, to }: DrawnResistor): boolean => from === 'in' && to === 'out';

interface PlacedProps {
  resistor: DrawnResistor;
  frame: PadFrame;
  /** With its name. */
  isLarge: boolean;
}

export function PlacedResistor({ resistor, frame, isLarge }: PlacedProps) {
  return resistor.to === 'ground' ? (
    <Shunt {...{ resistor, frame, isLarge }} />
  ) : (
    <Series {...{ resistor, frame, isLarge }} />
  );
}

function Shunt({ resistor, frame, isLarge }: PlacedProps) {
  const { line, height, box, points } = frame;
  const { arrangement = 'one part', from } = resistor;
  const x = from === 'ground' ? 0 : points[from];
  const length = height - line - 12;
  const side = halfBreadth(arrangement, box) + 9;
  // Small, there is room on the outer side only.
  const isLeft = !isLarge && from === 'in';
  return (
    <>
      <Branch {...{ x, y: line, length, arrangement }} box={{ ...box, length: length * 0.6 }} isDown />
      <Label
        x={isLeft ? x - side : x + side}
        y={line + length / 2 + (isLarge ? -3 : 5)}
        anchor={isLeft ? 'end' : 'start'}
        {...{ resistor, isLarge }}
        isStacked
      />
    </>
  );
}

function Series({ resistor, frame, isLarge }: PlacedProps) {
  const { line, bridge, box, points } = frame;
  const { arrangement = 'one part', from, to } = resistor;
  const [start, end] = [from, to].map((point) => (point === 'ground' ? 0 : points[point]));
  const length = end - start;
  const y = isAcross(resistor) ? bridge : line;
  const side = halfBreadth(arrangement, box);
  return (
    <>
      <Branch
        {...{ x: start, y, length, arrangement }}
        box={{ ...box, length: Math.min(box.length, length / 2) }}
      />
      <Label
        x={start + length / 2}
        y={isLarge ? y - side - 8 : y + side + 16}
        anchor="middle"
        {...{ resistor, isLarge }}
      />
    </>
  );
}

interface LabelProps {
  x: number;
  y: number;
  anchor: 'start' | 'middle' | 'end';
  resistor: DrawnResistor;
  isLarge: boolean;
  /** The name over the value instead of before it. */
  isStacked?: boolean;
}

function Label({ x, y, anchor, resistor, isLarge, isStacked = false }: LabelProps) {
  const below = isStacked && isLarge ? { x, dy: 17 } : {};
  return (
    <text x={x} y={y} textAnchor={anchor} fontWeight="700" fill={token('ink')}>
      {isLarge && (
        <tspan fontSize="12" fontWeight="400" fill={token('ink2')}>
          {`${resistor.name} `}
        </tspan>
      )}
      <tspan {...below}>{resistor.value}</tspan>
    </text>
  );
}
