import { useMemo } from 'react';
import { usePhone } from '../../../shared-ui/use-phone';
import { FilterAssumptions, FilterInputs } from '../filters/filter-inputs';
import { workFilter } from '../filters/figures';
import { FilterResults } from '../filters/filter-results';
import { INPUTS } from '../filters/inputs';
import { judge } from '../filters/judged';
import { PartsTable } from '../filters/parts-table';
import { inText } from '../filters/letter';
import { answerCells, spokenAnswer } from '../filters/words';
import { BenchFrame } from '../frame/bench-frame';
import { useHeavy } from '../heavy/use-heavy';
import { useBench } from '../inputs/use-bench';
import { AnswerLine } from '../results/answer-line';
import { ELSEWHERE, useWorked } from '../results/use-worked';

/** Ladders and resonators as real parts will make them, against what a transmitter's rule asks. */
export default function FiltersPage() {
  const bench = useBench('filters', INPUTS);
  const isPhone = usePhone();
  const { result: figures, isStale, problems: unread } = useWorked(bench, workFilter);
  const spread = useHeavy('filterBuilds', figures?.asked, bench);
  const problems = { ...unread, ...spread.problems };
  const judged = useMemo(() => figures && judge(figures, spread.result), [figures, spread.result]);
  const cells = useMemo(() => (figures && judged ? answerCells(figures, judged) : []), [figures, judged]);
  const text = useMemo(() => figures && judged && inText(figures, judged), [figures, judged]);
  const spoken = useMemo(() => (figures && judged ? spokenAnswer(figures, judged) : ''), [figures, judged]);
  // The same element while nothing of it changed: a key then draws its own field and no more.
  const answer = useMemo(
    () => (cells.length > 0 ? <AnswerLine cells={cells} isStale={isStale} /> : null),
    [cells, isStale],
  );
  return (
    <BenchFrame
      family="filters"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={text}
      spoken={spoken}
      inputs={
        <>
          <FilterInputs bench={bench} problems={problems} figures={figures} />
          {figures && !isPhone && (
            <PartsTable
              ladder={figures.fitted}
              toleranceRel={figures.values.toleranceRel}
              trimmed={figures.values.kind === 'band-pass' ? figures.values.trimmed : undefined}
            />
          )}
          <FilterAssumptions bench={bench} problems={problems} figures={figures} />
        </>
      }
      answer={answer}
    >
      {figures && judged ? (
        <FilterResults figures={figures} judged={judged} built={spread.result} isStale={spread.isStale} />
      ) : (
        <p>The filter shows here once every input can be read; what is amiss stands at its field.</p>
      )}
    </BenchFrame>
  );
}
