import { BenchFrame } from '../frame/bench-frame';
import { AssumedFigures } from '../inputs/assumed-figures';
import { BenchField } from '../inputs/bench-field';
import { InputGroup, Wide } from '../inputs/input-group';
import { useBench } from '../inputs/use-bench';
import { workPad, type WorkedPad } from '../pads/figures';
import { INPUTS } from '../pads/inputs';
import { PadResults } from '../pads/pad-results';
import { PowerCautions } from '../pads/power-cautions';
import { answerCells, inText, percentText } from '../pads/words';
import { AnswerLine } from '../results/answer-line';
import { spokenCells } from '../results/spoken-cells';
import { ELSEWHERE, useWorked } from '../results/use-worked';

function assumed({ asked }: WorkedPad): (readonly [string, string])[] {
  const used = ['Part of its rating used', `at most ${percentText(asked.derating)}`] as const;
  const enough = ['One part will do within', `± ${percentText(asked.enoughRel)}`] as const;
  return asked.parts === 'one' ? [used] : [used, enough];
}

/** Attenuators from parts that can be bought: what to fit, what it really gives, how hot it gets. */
export default function PadsPage() {
  const bench = useBench('pads', INPUTS);
  const { result, isStale, problems } = useWorked(bench, workPad);
  const cells = result ? answerCells(result) : [];
  const field = (name: keyof typeof INPUTS) => <BenchField bench={bench} name={name} problems={problems} />;
  return (
    <BenchFrame
      family="pads"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={result && inText(result)}
      spoken={spokenCells(cells)}
      inputs={
        <>
          <InputGroup title="The pad">
            <Wide>{field('kind')}</Wide>
            {field('sourceOhms')}
            {field('loadOhms')}
            {field('lossDb')}
            {field('toleranceRel')}
          </InputGroup>
          <InputGroup title="Its parts">
            <Wide>{field('series')}</Wide>
            <Wide>{field('parts')}</Wide>
          </InputGroup>
          <InputGroup title="Power into it">
            {field('told')}
            {field('inputDbm')}
            {field('inputWatts')}
          </InputGroup>
          {result && <PowerCautions worked={result} />}
          {result && (
            <AssumedFigures
              figures={assumed(result)}
              source="Common practice."
              hasProblem={'derating' in problems || 'enoughRel' in problems}
            >
              {field('derating')}
              {field('enoughRel')}
            </AssumedFigures>
          )}
        </>
      }
      answer={<AnswerLine cells={cells} isStale={isStale} />}
    >
      {result && <PadResults worked={result} />}
    </BenchFrame>
  );
}
