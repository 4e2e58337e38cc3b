import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { plusMinus } from '../../../lib/text';
import { StateLine } from '../../../shared-ui/states/state-line';
import { AssumedFigures } from '../inputs/assumed-figures';
import { BenchField } from '../inputs/bench-field';
import { InputGroup, Wide } from '../inputs/input-group';
import type { TypedTexts } from '../inputs/read-values';
import type { Bench } from '../inputs/use-bench';
import type { FilterFigures } from './figures';
import type { INPUTS } from './inputs';
import { misfitWords, ruleWords } from './limits';

interface FilterInputsProps {
  bench: Bench<typeof INPUTS>;
  problems: TypedTexts;
  figures: FilterFigures | undefined;
}

type Names = readonly (keyof typeof INPUTS)[];

const DESIGN: Names = [
  'cutoffHertz',
  'lowEdgeHertz',
  'centreHertz',
  'bandwidthHertz',
  'returnLossDb',
  'sourceOhms',
  'alNanohenry',
  'resonatorHenries',
  'inductorQ',
  'toleranceRel',
];
const AGAINST: Names = [
  'carrierLowHertz',
  'carrierHighHertz',
  'powerDbm',
  'secondDbc',
  'thirdDbc',
  'fourthDbc',
  'unwantedHertz',
  'unwantedDb',
  'wantedReturnLossDb',
];

const ASSUMED: Names = ['series', 'capacitorQ', 'spurUncertaintyDb', 'seed'];

/** Choices side by side in a narrow column, each on one line. */
const CLOSE = { '& .MuiToggleButton-root': { px: '4px', whiteSpace: 'nowrap' } } as const;

const titleOf = (bench: Bench<typeof INPUTS>): string =>
  bench.inputs.kind.options.find(({ value }) => value === bench.texts.kind)?.label ?? 'Filter';

function RuleWords({ figures: { against, carrier } }: { figures: FilterFigures }) {
  if (!against.rule) return 'A high-pass lets harmonics through: it is held against what lies below.';
  const misfit = misfitWords(against.rule, carrier);
  return (
    <>
      {ruleWords(against.rule, against.carrierWatts)}
      {misfit && (
        <StateLine shape="octagon" colour="oxide">
          {misfit}
        </StateLine>
      )}
    </>
  );
}

/** What the filter is made of, and what it is held against. */
export function FilterInputs({ bench, problems, figures }: FilterInputsProps) {
  const field = (name: keyof typeof INPUTS, isList = false) => (
    <BenchField key={name} bench={bench} name={name} problems={problems} isList={isList} />
  );
  return (
    <>
      <InputGroup title={titleOf(bench)}>
        <Wide>
          <Box sx={CLOSE}>{field('kind')}</Box>
        </Wide>
        <Box sx={CLOSE}>{field(bench.texts.kind === 'band-pass' ? 'resonators' : 'order')}</Box>
        {field('family', true)}
        {DESIGN.map((name) => field(name))}
        {bench.texts.kind === 'band-pass' && <Wide>{field('trimmed', true)}</Wide>}
      </InputGroup>
      <InputGroup title={bench.texts.kind === 'high-pass' ? 'Against what lies below' : 'Against the rule'}>
        {bench.texts.kind !== 'high-pass' && <Wide>{field('rule')}</Wide>}
        {field('band', true)}
        {AGAINST.map((name) => field(name))}
        {figures && (
          <Wide>
            <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
              <RuleWords figures={figures} />
            </Typography>
          </Wide>
        )}
      </InputGroup>
    </>
  );
}

/** What nobody typed but everything rests on. */
export function FilterAssumptions({ bench, problems, figures }: FilterInputsProps) {
  const field = (name: keyof typeof INPUTS, isList = false) => (
    <BenchField key={name} bench={bench} name={name} problems={problems} isList={isList} />
  );
  return (
    <AssumedFigures
      figures={[
        ['Capacitors', `${bench.texts.series}, Q ${bench.texts.capacitorQ}`],
        ['Harmonics before it', `${plusMinus(figures?.values.spurUncertaintyDb ?? 0)} dB`],
        ['Parts in their tolerance', 'evenly spread'],
        ['Builds', `1,000 from seed ${bench.texts.seed}`],
      ]}
      source="Common practice."
      hasProblem={ASSUMED.some((name) => name in problems)}
    >
      {ASSUMED.map((name) => field(name, true))}
    </AssumedFigures>
  );
}
