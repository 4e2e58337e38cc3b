import Box from '@mui/material/Box';
import { memo, useDeferredValue } from 'react';
import { CautionBox } from '../../../shared-ui/caution-box';
import { DataTable } from '../../../shared-ui/data-table';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { VerdictChip } from '../../../shared-ui/states/verdict-chip';
import { VERDICTS } from '../../../shared-ui/states/state-words';
import { BenchFrame } from '../frame/bench-frame';
import { useBench } from '../inputs/use-bench';
import { AgainstWindow } from '../readings/against-window';
import { BudgetChart } from '../readings/budget-chart';
import { BudgetTable } from '../readings/budget-table';
import { INPUTS } from '../readings/inputs';
import { ReadingInputs } from '../readings/reading-inputs';
import { WAYS } from '../readings/ways';
import { work, type WorkedReading } from '../readings/work';
import {
  budgetRows,
  figureOf,
  headlineOf,
  inText,
  otherFigures,
  sentence,
  windowText,
} from '../readings/words';
import { AnswerLine, type AnswerCell } from '../results/answer-line';
import { ChartOrTable } from '../results/chart-or-table';
import { ELSEWHERE, useWorked } from '../results/use-worked';

/** A watt is enough to burn. */
const BURNING_WATTS = 1;

function answerCells(worked: WorkedReading): AnswerCell[] {
  const { value, ...headline } = headlineOf(worked);
  const { reading, verdict } = worked;
  const [first] = otherFigures(reading);
  return [
    { ...headline, figure: value, share: 1.2 },
    ...(verdict
      ? [
          {
            name: `Window, ${figureOf(reading).unit}`,
            figure: windowText(worked),
            words: <VerdictChip verdict={verdict} narrow />,
            tone: verdict === 'too close to call' ? ('caution' as const) : undefined,
            share: 1.2,
          },
        ]
      : []),
    ...(first ? [{ name: first.name, figure: first.figure }] : []),
  ];
}

/** Drawn anew only with another result, not with every key. */
const Results = memo(function Results({ worked }: { worked: WorkedReading }) {
  const rows = budgetRows(worked.reading);
  const others = otherFigures(worked.reading);
  return (
    <>
      {(worked.reading.watts ?? 0) >= BURNING_WATTS && (
        <Box sx={{ mt: '14px' }}>
          <CautionBox kind="RF power">
            A load before power, and a rating that stands it. A probe stands less the higher the frequency,
            and a burn goes deep.
          </CautionBox>
        </Box>
      )}
      <AgainstWindow worked={worked} />
      <ChartOrTable
        title={
          worked.way === 'probe-loading'
            ? 'As part of another budget'
            : `Where ${figureOf(worked.reading).plusMinus} comes from`
        }
        chart={<BudgetChart rows={rows} />}
        table={<BudgetTable rows={rows} />}
      />
      {others.length > 0 && (
        <Box component="section" aria-label="The same in other words" sx={{ mt: '18px' }}>
          <SectionHeading>The same in other words</SectionHeading>
          <DataTable
            label="The same in other words"
            columns={[
              { key: 'name', header: 'Figure', cell: ({ name }) => name },
              { key: 'figure', header: 'Value', cell: ({ figure }) => figure, align: 'right', phone: 'end' },
            ]}
            rows={others}
            rowKey={({ name }) => name}
          />
        </Box>
      )}
    </>
  );
});

/** What an instrument shows, as a figure, how sure it is, and whether it lies in its window. */
export default function ReadingsPage() {
  const bench = useBench('readings', INPUTS);
  const { result, isStale, problems } = useWorked(bench, work);
  const way = WAYS.find(({ value }) => value === bench.texts.way)?.value ?? 'oscilloscope';
  // The chart gives way to the next key.
  const drawn = useDeferredValue(result);
  const spoken = result && [
    sentence(result),
    result.verdict && `${VERDICTS[result.verdict].words}. ${result.advice}`,
  ];
  return (
    <BenchFrame
      family="readings"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={result && inText(result)}
      spoken={spoken ? spoken.filter(Boolean).join('. ') : ''}
      inputs={<ReadingInputs bench={bench} way={way} problems={problems} />}
      answer={<AnswerLine cells={result ? answerCells(result) : []} isStale={isStale} />}
    >
      {drawn && <Results worked={drawn} />}
    </BenchFrame>
  );
}
