import { token, type TokenName } from '../../../shared-ui/tokens';
import type { PlacedLabel } from './labels';

/** A name with a halo of paper, so that it can be read over lines. */
export function ChartName({ label, colour = 'ink' }: { label: PlacedLabel; colour?: TokenName }) {
  const { text, x, y, anchor, isStrong } = label;
  return (
    <text
      {...{ x, y }}
      textAnchor={anchor}
      fontSize="10.5"
      fontWeight={isStrong ? 700 : 600}
      fill={token(colour)}
      stroke={token('paper')}
      strokeWidth="3.5"
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      {text}
    </text>
  );
}
