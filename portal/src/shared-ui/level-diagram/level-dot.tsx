import { token } from '../tokens';

interface LevelDotProps {
  x: number;
  /** Of the value and of the two ends of the whisker. */
  y: number;
  yHigh: number;
  yLow: number;
  kind: 'kept' | 'with mentor' | 'being entered';
}

const CAP = 3;
const HALO = { stroke: token('paper'), strokeWidth: 4, strokeOpacity: 0.7 };

/** A measured level with its whisker: ink dot, half-filled with the mentor, hollow copper ring while being entered. */
export function LevelDot({ x, y, yHigh, yLow, kind }: LevelDotProps) {
  const colour = token(kind === 'being entered' ? 'copper' : 'ink');
  const whisker = `M${x} ${yHigh}V${yLow}M${x - CAP} ${yHigh}h${CAP * 2}M${x - CAP} ${yLow}h${CAP * 2}`;
  return (
    <g fill="none">
      <path d={whisker} {...HALO} />
      <path d={whisker} stroke={colour} strokeWidth="1.4" />
      {kind === 'kept' && <circle cx={x} cy={y} r="3.4" fill={colour} />}
      {kind === 'with mentor' && (
        <>
          <circle cx={x} cy={y} r="3.4" fill={token('paper')} stroke={colour} strokeWidth="1.3" />
          <path d={`M${x} ${y - 3.4}a3.4 3.4 0 0 1 0 6.8z`} fill={colour} />
        </>
      )}
      {kind === 'being entered' && (
        <circle cx={x} cy={y} r="4.2" fill={token('paper')} stroke={colour} strokeWidth="2" />
      )}
    </g>
  );
}

export const dotKind = (isBeingEntered: boolean, isWithMentor = false): LevelDotProps['kind'] => {
  if (isBeingEntered) return 'being entered';
  return isWithMentor ? 'with mentor' : 'kept';
};
