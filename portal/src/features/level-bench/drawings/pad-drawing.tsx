import type { PadPoint } from '@ferrite-row/levels';
import { token } from '../../../shared-ui/tokens';
import type { Box } from './branch';
import { isAcross, PlacedResistor, type DrawnResistor, type PadFrame } from './placed-resistor';

interface PadDrawingProps {
  resistors: readonly DrawnResistor[];
  width: number;
  /** 'small' for the cell of an answer: values only, 72 high; 'large' with names, 140 high; a bridge adds to both. */
  size: 'small' | 'large';
  /** In one sentence, for who does not see it. */
  words: string;
}

interface Shape {
  /** Height with and without a bridge over the line. */
  heights: readonly [plain: number, bridged: number];
  /** Of the line from in to out, likewise. */
  lines: readonly [plain: number, bridged: number];
  bridge: number;
  /** From either edge to the pad's own points in and out, as part of the width. */
  margin: number;
  box: Box;
  font: number;
}

const SHAPES: Record<PadDrawingProps['size'], Shape> = {
  small: {
    heights: [72, 96],
    lines: [12, 40],
    bridge: 12,
    margin: 0.29,
    box: { length: 46, breadth: 15 },
    font: 13,
  },
  large: {
    heights: [140, 176],
    lines: [56, 94],
    bridge: 40,
    margin: 0.26,
    box: { length: 58, breadth: 18 },
    font: 14,
  },
};

/** A pad with its values: series resistors on the line, shunts to ground, a bridge over it. */
export function PadDrawing({ resistors, width, size, words }: PadDrawingProps) {
  const frame = frameOf(resistors, width, SHAPES[size]);
  const { line } = frame;
  return (
    <svg
      width={width}
      height={frame.height}
      role="img"
      aria-label={words}
      fill="none"
      fontSize={SHAPES[size].font}
      style={{ display: 'block' }}
    >
      <g stroke={token('ink')} strokeWidth="1.5">
        <path d={wires(resistors, frame)} />
        {[4, width - 4].map((x) => (
          <circle key={x} cx={x} cy={line} r="3.5" fill={token('sheet')} />
        ))}
      </g>
      {resistors.map((resistor) => (
        <PlacedResistor key={resistor.name} resistor={resistor} frame={frame} isLarge={size === 'large'} />
      ))}
      {knots(resistors, frame).map((x) => (
        <circle key={x} cx={x} cy={line} r="3" fill={token('ink')} />
      ))}
    </svg>
  );
}

function frameOf(resistors: readonly DrawnResistor[], width: number, shape: Shape): PadFrame {
  const isBridged = resistors.some(isAcross) && resistors.some(({ to }) => to === 'mid');
  const at = isBridged ? 1 : 0;
  return {
    width,
    height: shape.heights[at],
    line: shape.lines[at],
    bridge: isBridged ? shape.bridge : shape.lines[at],
    points: { in: width * shape.margin, mid: width / 2, out: width * (1 - shape.margin) },
    box: shape.box,
  };
}

/** The leads to the terminals, the legs of a bridge, and the line where nothing stands in it. */
function wires(resistors: readonly DrawnResistor[], { line, bridge, width, points }: PadFrame): string {
  const leads = `M8 ${line}H${points.in}M${points.out} ${line}H${width - 8}`;
  const legs = `M${points.in} ${line}V${bridge}M${points.out} ${line}V${bridge}`;
  const isBroken = resistors.some(({ to }) => to !== 'ground');
  return leads + legs + (isBroken ? '' : `M${points.in} ${line}H${points.out}`);
}

/** Where three or more meet; the terminals' leads meet in and out. */
function knots(resistors: readonly DrawnResistor[], { points }: PadFrame): number[] {
  const meeting = (point: PadPoint) =>
    resistors.filter(({ from, to }) => from === point || to === point).length;
  return (['in', 'mid', 'out'] as const)
    .filter((point) => meeting(point) + (point === 'mid' ? 0 : 1) > 2)
    .map((point) => points[point]);
}
