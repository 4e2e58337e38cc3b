import Box from '@mui/material/Box';
import { memo, useId, useState, type ReactNode } from 'react';
import { Icon } from '../../../shared-ui/icon';
import { token } from '../../../shared-ui/tokens';
import { usePhone } from '../../../shared-ui/use-phone';
import { AssumedFigures } from '../inputs/assumed-figures';
import { InputGroup, Wide } from '../inputs/input-group';
import { readValues, type TypedTexts } from '../inputs/read-values';
import { BenchField } from '../inputs/bench-field';
import type { Bench } from '../inputs/use-bench';
import { assumedFigures } from './assumed';
import { ASSUMED, INPUTS, OF_THE_SAMPLE, type MixingInputName, type MixingValues } from './inputs';

const started = readValues(INPUTS, {});
if (!started.isComplete) throw new Error('what the page starts with can be read');
const STARTING = started.values;

interface MixingInputsProps {
  bench: Bench<typeof INPUTS>;
  problems: TypedTexts;
  /** The last that could be read. */
  values?: MixingValues;
}

const OWN_FILTER = [
  'centreHertz',
  'bandwidthHertz',
  'cutoffHertz',
  'resonatorHenries',
  'order',
  'inductorQ',
] as const;

/** What goes into the mixer, what drives it, and what is taken for granted. */
export function MixingInputs({ bench, problems, values }: MixingInputsProps) {
  const isPhone = usePhone();
  const field = (name: MixingInputName) => <BenchField key={name} {...{ bench, name, problems }} />;
  const filter = (
    <>
      <Wide>
        <Box sx={{ '& .MuiSelect-select': { fontSize: '0.875rem' } }}>{field('filter')}</Box>
      </Wide>
      {OWN_FILTER.map(field)}
    </>
  );
  const goal = (
    <>
      {field('goalDb')}
      <Box sx={{ '& .MuiToggleButton-root': { px: '4px', fontSize: '0.8125rem' } }}>{field('ruleSet')}</Box>
    </>
  );
  // From before anything could be worked out, so that a figure that is in the way can be mended.
  const assumed = <Assumed {...{ bench, problems }} values={values ?? STARTING} />;
  if (isPhone) {
    return (
      <>
        <InputPairs>
          {(['ifHertz', 'loHertz', 'wanted', 'maxOrder', 'ratedDbm', 'sourceDbm'] as const).map(field)}
        </InputPairs>
        <Folded name="Filter" words={labelOf(bench.texts.filter)}>
          <InputPairs>
            {filter}
            {field('ifDbm')}
            {goal}
          </InputPairs>
          {assumed}
        </Folded>
      </>
    );
  }
  const isSample = OF_THE_SAMPLE.every((name) => bench.texts[name] === INPUTS[name].start);
  return (
    <>
      <InputGroup title="Into the mixer" from={isSample && 'Sample plan, stage 8'}>
        {(['ifHertz', 'ifDbm', 'loHertz', 'maxOrder'] as const).map(field)}
        <Wide>{field('wanted')}</Wide>
        {filter}
        {goal}
      </InputGroup>
      <InputGroup title="Its drive" from="Diode ring">
        {field('ratedDbm')}
        {field('sourceDbm')}
      </InputGroup>
      {assumed}
    </>
  );
}

const Assumed = memo(
  function Assumed({ bench, problems, values }: Required<MixingInputsProps>) {
    return (
      <AssumedFigures figures={assumedFigures(values)} source="Class figures, common practice.">
        {ASSUMED.map((name) => (
          <BenchField key={name} {...{ bench, name, problems }} />
        ))}
      </AssumedFigures>
    );
  },
  (before, after) =>
    before.values.ratedDbm === after.values.ratedDbm &&
    ASSUMED.every(
      (name) =>
        before.values[name] === after.values[name] &&
        before.bench.texts[name] === after.bench.texts[name] &&
        before.problems[name] === after.problems[name],
    ),
);

const labelOf = (filter: string | undefined): string =>
  INPUTS.filter.options.find(({ value }) => value === filter)?.label ?? '';

const InputPairs = ({ children }: { children: ReactNode }) => (
  <Box
    sx={{
      display: 'grid',
      gridTemplateColumns: 'repeat(2, minmax(0, 1fr))',
      alignItems: 'start',
      gap: '8px 10px',
      mb: '10px',
    }}
  >
    {children}
  </Box>
);

/** Set once and left alone: one line that opens. */
function Folded({ name, words, children }: { name: string; words: string; children: ReactNode }) {
  const [isOpen, setIsOpen] = useState(false);
  const id = useId();
  return (
    <Box
      sx={{ borderTop: `1px solid ${token('rule')}`, borderBottom: `1px solid ${token('rule')}`, mb: '8px' }}
    >
      <Box
        component="button"
        type="button"
        aria-expanded={isOpen}
        aria-controls={id}
        onClick={() => setIsOpen(!isOpen)}
        sx={{
          display: 'flex',
          alignItems: 'center',
          gap: '6px',
          width: '100%',
          minHeight: 44,
          p: 0,
          border: 0,
          background: 'none',
          color: 'inherit',
          textAlign: 'left',
          typography: 'small',
        }}
      >
        {name}
        <Box component="b" sx={{ flex: 1 }}>
          {words}
        </Box>
        <Icon name="down" size={16} />
      </Box>
      <Box id={id} hidden={!isOpen} sx={{ pt: '6px' }}>
        {isOpen && children}
      </Box>
    </Box>
  );
}
