import { useDeferredValue } from 'react';
import { BenchFrame } from '../frame/bench-frame';
import { GuardResults } from '../guards/guard-results';
import { INPUTS, shownOf, type Judge } from '../guards/inputs';
import { inText, spoken } from '../guards/judged';
import { work } from '../guards/work';
import { BenchField } from '../inputs/bench-field';
import { InputGroup, Wide } from '../inputs/input-group';
import { useClubInputs } from '../inputs/use-club-inputs';
import { useBench } from '../inputs/use-bench';
import { AnswerLine } from '../results/answer-line';
import { ELSEWHERE, useWorked } from '../results/use-worked';

/** Choices whose words want the whole width. */
const isWide = (name: string): boolean => {
  const input = INPUTS[name as keyof typeof INPUTS];
  return input.kind === 'choice';
};

/** Instruments, spurious emissions, bands, exposure and heat: what a rule or a part allows, and what it takes to keep to it. */
export default function GuardsPage() {
  const bench = useBench('guards', useClubInputs(INPUTS));
  const { result, isStale, problems } = useWorked(bench, work);
  const judge = bench.texts.judge as Judge;
  // While another is being worked out, the last one's result does not belong to what is asked.
  const shown = result?.judge === judge ? result : undefined;
  // The drawings give way to the next key.
  const drawn = useDeferredValue(shown);
  return (
    <BenchFrame
      family="guards"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={shown && inText(shown)}
      spoken={shown ? spoken(shown) : ''}
      inputs={
        <InputGroup title="To be judged">
          <Wide>
            <BenchField bench={bench} name="judge" problems={problems} />
          </Wide>
          {shownOf(bench.texts).map((name) => {
            const field = (
              <BenchField key={name} bench={bench} name={name as keyof typeof INPUTS} problems={problems} />
            );
            return isWide(name) ? <Wide key={name}>{field}</Wide> : field;
          })}
        </InputGroup>
      }
      answer={<AnswerLine cells={shown?.figures ?? []} isStale={isStale} />}
    >
      {drawn?.judge === judge && <GuardResults shown={drawn} />}
    </BenchFrame>
  );
}
