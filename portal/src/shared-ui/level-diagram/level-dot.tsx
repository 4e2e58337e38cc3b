import { token } from '../tokens';

interface LevelDotProps {
  x: number;
  /** Of the value and of the two ends of the whisker. */
  y: number;
  yHigh: number;
  yLow: number;
  kind: 'kept' | 'with mentor' | 'being entered';
  /** Half the width of the caps: wider where a whisker is only a few pixels. */
  cap?: number;
}

const HALO = { stroke: token('paper'), strokeWidth: 4, strokeOpacity: 0.7 };

/** A measured level with its whisker: ink dot, half-filled with the mentor, hollow copper ring while being entered. */
export function LevelDot({ x, y, yHigh, yLow, kind, cap = 4 }: LevelDotProps) {
  const colour = token(kind === 'being entered' ? 'copper' : 'ink');
  const whisker = `M${x} ${yHigh}V${yLow}M${x - cap} ${yHigh}h${cap * 2}M${x - cap} ${yLow}h${cap * 2}`;
  return (
    <g fill="none">
      <path d={whisker} {...HALO} />
      <path d={whisker} stroke={colour} strokeWidth="1.5" />
      {kind === 'kept' && <circle cx={x} cy={y} r="3.8" fill={colour} />}
      {kind === 'with mentor' && (
        <>
          <circle cx={x} cy={y} r="3.6" fill={token('paper')} stroke={colour} strokeWidth="1.3" />
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
