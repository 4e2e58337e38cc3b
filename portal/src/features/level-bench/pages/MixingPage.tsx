import Typography from '@mui/material/Typography';
import { useMemo } from 'react';
import { usePhone } from '../../../shared-ui/use-phone';
import { BenchFrame } from '../frame/bench-frame';
import { useBench } from '../inputs/use-bench';
import { useClubInputs } from '../inputs/use-club-inputs';
import { Answer } from '../mixing/answer';
import { spokenAnswer } from '../mixing/answer-words';
import { copiedText } from '../mixing/copied-text';
import { DriveCaution } from '../mixing/drive-caution';
import { ASSUMED, INPUTS } from '../mixing/inputs';
import { MixingInputs } from '../mixing/mixing-inputs';
import { PhoneAnswer } from '../mixing/phone-answer';
import { Products } from '../mixing/products';
import { TuningTable } from '../mixing/tuning-table';
import { useMixing } from '../mixing/use-mixing';
import { RULE_SETS } from '../mixing/work-out';
import { ELSEWHERE } from '../results/use-worked';

/** Every product of a mixer, judged behind the filter after it, and the drive it is given. */
export default function MixingPage() {
  const bench = useBench('mixing', useClubInputs(INPUTS));
  const { result, isStale, problems } = useMixing(bench);
  const isPhone = usePhone();
  const text = useMemo(() => result && copiedText(result), [result]);
  const ShownAnswer = isPhone ? PhoneAnswer : Answer;
  // The fields of assumed figures may be folded away.
  const hidden = ASSUMED.map((name) => problems[name]).find(Boolean);
  return (
    <BenchFrame
      family="mixing"
      link={bench.link}
      problem={problems[ELSEWHERE] ?? hidden}
      text={text}
      spoken={result ? spokenAnswer(result) : ''}
      inputs={<MixingInputs {...{ bench, problems }} values={result?.values} />}
      answer={result && <ShownAnswer mixing={result} isStale={isStale} />}
    >
      {result && (
        <>
          <DriveCaution mixing={result} />
          <Products mixing={result} />
          <TuningTable mixing={result} />
          <Typography variant="small" component="p" sx={{ m: 0, mt: '14px', color: 'token.ink3' }}>
            Bands: {RULE_SETS[result.values.ruleSet].title}. {RULE_SETS[result.values.ruleSet].caution}
          </Typography>
        </>
      )}
    </BenchFrame>
  );
}
