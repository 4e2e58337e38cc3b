import { token } from '../../../shared-ui/tokens';

export type Arrangement = 'one part' | 'parallel' | 'series';

/** Of a resistor's box, along and across. */
export interface Box {
  length: number;
  breadth: number;
}

interface BranchProps {
  /** Where it starts. */
  x: number;
  y: number;
  /** From there to its other end, with the leads. */
  length: number;
  /** Down to ground instead of along the line. */
  isDown?: boolean;
  arrangement: Arrangement;
  box: Box;
}

/** A resistor with its leads, or two of them as they are to be soldered. */
export function Branch({ x, y, length, isDown = false, arrangement, box }: BranchProps) {
  const { wires, boxes } = DRAWN[arrangement](length, box);
  return (
    <g
      transform={`translate(${x} ${y})${isDown ? ' rotate(90)' : ''}`}
      stroke={token('ink')}
      strokeWidth="1.5"
    >
      <path d={wires} />
      {boxes.map((one) => (
        <rect key={`${one.x} ${one.y}`} {...one} fill={token('sheet')} />
      ))}
      {isDown && <path d={`M${length} -9v18M${length + 4} -5v10M${length + 8} -2v4`} />}
    </g>
  );
}

/** Between two boxes, and from a box to the wire around it. */
const GAP = 8;
const AROUND = 5;

/** Each of two in parallel is as much thinner, and as far off the middle. */
const THIN = 0.75;
const OFF = 0.6;

/** From the middle to the outer edge. */
export const halfBreadth = (arrangement: Arrangement, { breadth }: Box): number =>
  arrangement === 'parallel' ? breadth * (OFF + THIN / 2) : breadth / 2;

interface Drawn {
  wires: string;
  boxes: { x: number; y: number; width: number; height: number }[];
}

/** Along x, from 0 to the length of the branch. */
const DRAWN: Record<Arrangement, (length: number, box: Box) => Drawn> = {
  'one part': (length, { length: long, breadth }) => {
    const start = (length - long) / 2;
    return {
      wires: `M0 0H${start}M${start + long} 0H${length}`,
      boxes: [{ x: start, y: -breadth / 2, width: long, height: breadth }],
    };
  },
  series: (length, { length: long, breadth }) => {
    const start = (length - long) / 2;
    const each = (long - GAP) / 2;
    return {
      wires: `M0 0H${start}M${start + each} 0h${GAP}M${start + long} 0H${length}`,
      boxes: [start, start + each + GAP].map((x) => ({ x, y: -breadth / 2, width: each, height: breadth })),
    };
  },
  parallel: (length, { length: long, breadth }) => {
    const [start, end] = [(length - long) / 2, (length + long) / 2];
    const off = breadth * OFF;
    const height = breadth * THIN;
    return {
      wires: [
        `M0 0H${start - AROUND}M${start} ${-off}h${-AROUND}V${off}h${AROUND}`,
        `M${end} ${-off}h${AROUND}V${off}h${-AROUND}M${end + AROUND} 0H${length}`,
      ].join(''),
      boxes: [-off, off].map((middle) => ({ x: start, y: middle - height / 2, width: long, height })),
    };
  },
};
