import { formatQuantity } from '@ferrite-row/levels';
import { signed } from '../../../lib/text';
import { DataTable } from '../../../shared-ui/data-table';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { convert, figureRows, inText, type Converted } from '../conversions/figures';
import { INPUTS, KNOWN } from '../conversions/inputs';
import { BenchFrame } from '../frame/bench-frame';
import { BenchField } from '../inputs/bench-field';
import { InputGroup, Wide } from '../inputs/input-group';
import { useBench } from '../inputs/use-bench';
import { AnswerLine, type AnswerCell } from '../results/answer-line';
import { ELSEWHERE, useWorked } from '../results/use-worked';

function answerCells({ figures, ohms }: Converted): AnswerCell[] {
  const peakToPeak = formatQuantity(figures.voltsPeakToPeak, 'V');
  return [
    { name: `Level in ${formatQuantity(ohms, 'ohm')}`, figure: signed(figures.dbm, 2), unit: 'dBm' },
    { name: 'Power', figure: formatQuantity(figures.watts, 'W') },
    { name: 'On an oscilloscope', figure: peakToPeak, unit: 'p-p', words: 'of a sine' },
  ];
}

/** dBm, watts and volts in any resistance: each figure of a level from any one of them. */
export default function ConversionsPage() {
  const bench = useBench('conversions', INPUTS);
  const { result, isStale, problems } = useWorked(bench, convert);
  const cells = result ? answerCells(result) : [];
  return (
    <BenchFrame
      family="conversions"
      link={bench.link}
      problem={problems[ELSEWHERE]}
      text={result && inText(result)}
      spoken={cells.map(({ name, figure, unit = '' }) => `${name} ${figure} ${unit}`).join('. ')}
      inputs={
        <InputGroup title="A level">
          <Wide>
            <BenchField bench={bench} name="from" problems={problems} />
          </Wide>
          {KNOWN.map((name) => (
            <BenchField key={name} bench={bench} name={name} problems={problems} />
          ))}
          <BenchField bench={bench} name="resistance" problems={problems} />
        </InputGroup>
      }
      answer={<AnswerLine cells={cells} isStale={isStale} />}
    >
      {result && (
        <>
          <SectionHeading>Every way to say it</SectionHeading>
          <DataTable
            label="Every way to say it"
            columns={[
              { key: 'name', header: 'Figure', cell: ({ name }) => name },
              { key: 'figure', header: 'Value', cell: ({ figure }) => figure, align: 'right', phone: 'end' },
            ]}
            rows={figureRows(result)}
            rowKey={({ name, figure }) => `${name} ${figure}`}
          />
        </>
      )}
    </BenchFrame>
  );
}
