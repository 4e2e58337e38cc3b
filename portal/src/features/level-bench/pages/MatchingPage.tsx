import Box from '@mui/material/Box';
import { CautionBox } from '../../../shared-ui/caution-box';
import { BenchFrame } from '../frame/bench-frame';
import { isShown } from '../inputs/fields';
import { BenchField } from '../inputs/bench-field';
import { InputGroup, Wide } from '../inputs/input-group';
import { useBench } from '../inputs/use-bench';
import { INPUTS } from '../matching/inputs';
import { MatchingPicture } from '../matching/matching-picture';
import { sheetText } from '../results/sheet';
import { work } from '../matching/work';
import { AnswerLine } from '../results/answer-line';
import { spokenCells } from '../results/spoken-cells';
import { ELSEWHERE, useWorked } from '../results/use-worked';

type Name = keyof typeof INPUTS;

const NAMES = Object.keys(INPUTS) as Name[];

/** Matches, L-networks, windings and resonance. */
export default function MatchingPage() {
  const bench = useBench('matching', INPUTS);
  const { result, isStale, problems } = useWorked(bench, work);
  const shown = NAMES.filter((name) => isShown(INPUTS, name, bench.texts));
  const cells = result?.cells ?? [];
  return (
    <BenchFrame
      family="matching"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={result && sheetText(result)}
      spoken={spokenCells(cells)}
      inputs={
        <>
          <InputGroup title="To work out">
            {shown.map((name) => {
              const field = <BenchField key={name} bench={bench} name={name} problems={problems} />;
              return INPUTS[name].kind === 'choice' ? <Wide key={name}>{field}</Wide> : field;
            })}
          </InputGroup>
          {result?.note && (
            <Box sx={{ mb: '18px', typography: 'small', color: 'token.ink3' }}>{result.note}</Box>
          )}
          {bench.texts.calculation === 'flux' && (
            <CautionBox kind="hot parts">
              A core driven hard gets hot without a sign, and a hot core takes the match with it. Its maker’s
              sheet says how much flux it stands at a frequency.
            </CautionBox>
          )}
        </>
      }
      answer={<AnswerLine cells={cells} isStale={isStale} />}
    >
      {result && <MatchingPicture sheet={result} />}
    </BenchFrame>
  );
}
