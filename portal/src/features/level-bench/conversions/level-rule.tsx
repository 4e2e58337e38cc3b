import Box from '@mui/material/Box';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useWidth } from '../../../shared-ui/level-diagram/use-width';
import { token } from '../../../shared-ui/tokens';
import { markRows, ruleScale, type RuleScale } from './rule-scale';
import type { ConversionSheet, RuleMark } from './sheet';

const USUAL_WIDTH = 838;
/** Heads of the rows at the left. */
const GUTTER = 96;
/** The last figure is centred on its tick. */
const END = 34;

const MARK_ROW = 20;
/** Words of a mark take so much. */
const MARK_WIDTH = 104;

/** Levels on a rule, each figure with its power and voltage under it, what is typed marked. */
export function LevelRule({ sheet }: { sheet: ConversionSheet }) {
  const [frame, width] = useWidth<HTMLDivElement>(USUAL_WIDTH);
  const scale = ruleScale(sheet, width - GUTTER - END);
  const x = (db: number) => GUTTER + ((db - scale.from) / (scale.to - scale.from)) * (width - GUTTER - END);
  const rows = markRows(
    sheet.marks.map(({ db }) => x(db)),
    MARK_WIDTH,
  );
  const line = 34 + MARK_ROW * Math.max(...rows);
  const words = sheet.marks.map((mark) => mark.words).join(', ');
  return (
    <Box component="section" aria-label="On the rule" sx={{ mt: '18px' }}>
      <SectionHeading>On the rule</SectionHeading>
      <div ref={frame}>
        <svg
          width={width}
          height={line + 78}
          role="img"
          aria-label={`A rule of levels: ${words}`}
          fontSize="11"
        >
          <Ticks scale={scale} x={x} y={line} />
          <path d={`M${x(scale.from)} ${line}H${x(scale.to)}`} stroke={token('ink')} strokeWidth="1.5" />
          {sheet.marks.map((mark, index) => (
            <Mark key={index} mark={mark} x={x(mark.db)} y={line} row={rows[index] ?? 0} width={width} />
          ))}
        </svg>
      </div>
    </Box>
  );
}

const ROWS_AT = [24, 44, 62];

function Ticks({ scale, x, y }: { scale: RuleScale; x: (db: number) => number; y: number }) {
  return (
    <g textAnchor="middle">
      {scale.rows.map((head, row) => (
        <text key={head} x={0} y={y + ROWS_AT[row]} textAnchor="start" fill={token('ink2')}>
          {head}
        </text>
      ))}
      {scale.ticks.map(({ db, words }) => (
        <g key={db}>
          <path
            d={`M${x(db)} ${y - 6}v12`}
            stroke={token(db === 0 ? 'ink' : 'edge')}
            strokeWidth={db === 0 ? 2 : 1}
          />
          {words.map((text, row) => (
            <text
              key={row}
              x={x(db)}
              y={y + ROWS_AT[row]}
              fontSize={row === 0 ? 13 : 11}
              fontWeight={row === 0 ? 700 : 400}
              fill={token(row === 0 ? 'ink' : 'ink2')}
            >
              {text}
            </text>
          ))}
        </g>
      ))}
    </g>
  );
}

interface MarkProps {
  mark: RuleMark;
  x: number;
  y: number;
  row: number;
  width: number;
}

function Mark({ mark, x, y, row, width }: MarkProps) {
  const colour = token(mark.tone);
  const top = y - 16 - MARK_ROW * row;
  // Near the right end the words stand to the left of their mark.
  const isLeft = x + MARK_WIDTH > width;
  return (
    <g>
      <path d={`M${x} ${top - 8}V${y - 5}`} stroke={colour} strokeWidth="1.5" strokeDasharray="2 3" />
      <circle
        cx={x}
        cy={y}
        r="5"
        fill={token(mark.tone === 'copper' ? 'sheet' : 'ink')}
        stroke={colour}
        strokeWidth="2"
      />
      <text
        x={isLeft ? x - 6 : x + 6}
        y={top}
        textAnchor={isLeft ? 'end' : 'start'}
        fontSize="12"
        fontWeight="700"
        fill={colour}
      >
        {mark.words}
      </text>
    </g>
  );
}
