import Box from '@mui/material/Box';
import { useCallback, useDeferredValue, useMemo, useState } from 'react';
import { fixed, signed } from '../../../lib/text';
import { ChainResults } from '../chain/chain-results';
import { INPUTS } from '../chain/inputs';
import { showStage, StageList } from '../chain/stage-list';
import { problemIn, work, type WorkedChain, type WorkedStage } from '../chain/work';
import { inText, powerText, spokenChain } from '../chain/words';
import { BenchFrame } from '../frame/bench-frame';
import { BenchField } from '../inputs/bench-field';
import { InputGroup, Wide } from '../inputs/input-group';
import { useBench } from '../inputs/use-bench';
import { AnswerLine, type AnswerCell } from '../results/answer-line';
import { ELSEWHERE, useWorked } from '../results/use-worked';

function headroomCell({ leastHeadroom }: WorkedChain): AnswerCell[] {
  if (leastHeadroom?.headroomDb === undefined) return [];
  const { headroomDb, isLow, name } = leastHeadroom;
  return [
    {
      name: 'Least headroom',
      ...{ figure: fixed(headroomDb), unit: 'dB' },
      words: headroomDb < 0 ? `Over its limit: ${name}` : `${isLow ? 'Low: ' : ''}${name}`,
      tone: isLow ? 'caution' : 'plain',
    },
  ];
}

const isCompressed = ({ peakDbm, outputCompressionDbm = Infinity }: WorkedStage): boolean =>
  peakDbm > outputCompressionDbm;

function answerCells(chain: WorkedChain): AnswerCell[] {
  const { whole } = chain;
  const { noiseFigureDb, outputInterceptDbm, intermodulationDbc } = whole;
  return [
    {
      name: 'Out of the chain, PEP',
      ...{ figure: signed(whole.peakDbm), unit: 'dBm' },
      words: isCompressed(whole)
        ? `Over where the chain gives 1 dB less, ${signed(whole.outputCompressionDbm ?? 0)} dBm`
        : `${powerText(whole.peakDbm)}, average ${powerText(whole.averageDbm)}`,
      tone: isCompressed(whole) ? 'caution' : 'plain',
    },
    noiseFigureDb === undefined
      ? { name: 'Noise figure', figure: 'unknown', words: 'a stage with gain has none typed' }
      : { name: 'Noise figure', figure: fixed(noiseFigureDb), unit: 'dB', words: 'of the whole chain' },
    ...(outputInterceptDbm === undefined
      ? []
      : [
          {
            name: 'Intercept at the output',
            ...{ figure: signed(outputInterceptDbm), unit: 'dBm' },
            words: `products ${signed(intermodulationDbc ?? 0)} dBc`,
          },
        ]),
    ...headroomCell(chain),
  ];
}

/** Level, noise and headroom from stage to stage. */
export default function ChainPage() {
  const bench = useBench('chain', INPUTS);
  const { result, isStale, problems } = useWorked(bench, work);
  const [open, setOpen] = useState<number>();
  const { stages = '' } = bench.texts;
  const stageProblems = useMemo(() => problemIn(stages), [stages]);
  const [place, words] = Object.entries(stageProblems)[0] ?? [];
  // In the open stage it stands at its field.
  const isAtField = place !== undefined && open !== undefined && place.startsWith(`stages[${open}].`);
  // The diagram gives way to the next key.
  const drawn = useDeferredValue(result);
  const openFromDiagram = useCallback((index: number) => {
    setOpen(index);
    showStage(index);
  }, []);
  return (
    <BenchFrame
      family="chain"
      link={bench.link}
      problem={problems[ELSEWHERE] ?? (isAtField ? undefined : (words ?? problems.stages))}
      text={result && inText(result)}
      spoken={result ? spokenChain(result) : ''}
      inputs={
        <>
          <InputGroup title="Into the chain">
            <Wide>
              <BenchField bench={bench} name="inputDbm" problems={problems} />
            </Wide>
            <Wide>
              <BenchField bench={bench} name="signal" problems={problems} />
            </Wide>
            <BenchField bench={bench} name="peakOverAverageDb" problems={problems} />
          </InputGroup>
          <StageList
            text={stages}
            onChange={(text) => bench.type('stages', text)}
            problems={stageProblems}
            open={open}
            onOpen={setOpen}
          />
          <Box component="p" sx={{ m: 0, mb: '18px', typography: 'small', color: 'token.ink3' }}>
            Gains, windows and limits of the plan Larkmoor Twenty to start with; noise, intercept and
            compression are class figures, common practice. Type your own when you have measured them.
          </Box>
          <InputGroup title="Two tones">
            <Wide>
              <BenchField bench={bench} name="firstHertz" problems={problems} />
            </Wide>
            <Wide>
              <BenchField bench={bench} name="secondHertz" problems={problems} />
            </Wide>
          </InputGroup>
        </>
      }
      answer={<AnswerLine cells={result ? answerCells(result) : []} isStale={isStale} />}
    >
      {drawn && <ChainResults chain={drawn} open={open} onOpen={openFromDiagram} />}
    </BenchFrame>
  );
}
