import { work } from '../conversions/work';
import { INPUTS } from '../conversions/inputs';
import { LevelRule } from '../conversions/level-rule';
import { BenchFrame } from '../frame/bench-frame';
import { BenchField } from '../inputs/bench-field';
import { isShown } from '../inputs/fields';
import { InputGroup, Wide } from '../inputs/input-group';
import { useBench } from '../inputs/use-bench';
import { AnswerLine } from '../results/answer-line';
import { FigureTable } from '../results/figure-table';
import { sheetText } from '../results/sheet';
import { spokenCells } from '../results/spoken-cells';
import { ELSEWHERE, useWorked } from '../results/use-worked';

type Name = keyof typeof INPUTS;

const NAMES = Object.keys(INPUTS) as Name[];

/** dBm, watts and volts in any resistance; ratios, sums, and a source with its load. */
export default function ConversionsPage() {
  const bench = useBench('conversions', INPUTS);
  const { result, isStale, problems } = useWorked(bench, work);
  const cells = result?.cells ?? [];
  const shown = NAMES.filter((name) => isShown(INPUTS, name, bench.texts));
  return (
    <BenchFrame
      family="conversions"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={result && sheetText(result)}
      spoken={spokenCells(cells)}
      inputs={
        <InputGroup title="To convert">
          {shown.map((name) => {
            const field = <BenchField key={name} bench={bench} name={name} problems={problems} />;
            return INPUTS[name].kind === 'choice' ? <Wide key={name}>{field}</Wide> : field;
          })}
        </InputGroup>
      }
      answer={<AnswerLine cells={cells} isStale={isStale} />}
    >
      {result && (
        <>
          <LevelRule sheet={result} />
          <FigureTable figures={result.figures} title={result.heading} />
        </>
      )}
    </BenchFrame>
  );
}
