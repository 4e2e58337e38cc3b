import { BenchField } from '../inputs/bench-field';
import { AssumedFigures } from '../inputs/assumed-figures';
import type { BenchInputs } from '../inputs/fields';
import { InputGroup, Wide } from '../inputs/input-group';
import type { TypedTexts } from '../inputs/read-values';
import type { Bench } from '../inputs/use-bench';
import { ASSUMED_FIGURES, figureText } from './assumed';
import { groupsOf } from './inputs';
import { keyOf, type Way } from './ways';

interface ReadingInputsProps {
  bench: Bench<BenchInputs>;
  way: Way;
  problems: TypedTexts;
}

/** What the instrument shows, the window it is held against, and what is taken for granted. */
export function ReadingInputs({ bench, way, problems }: ReadingInputsProps) {
  const { shown, window, assumed } = groupsOf(way);
  const field = (name: string) => <BenchField key={name} bench={bench} name={name} problems={problems} />;
  return (
    <>
      <InputGroup title="The reading">
        <Wide>{field('way')}</Wide>
        {shown.map(field)}
      </InputGroup>
      {window.length > 0 && <InputGroup title="Its window">{window.map(field)}</InputGroup>}
      {ASSUMED_FIGURES[way].length > 0 && (
        <AssumedFigures
          figures={ASSUMED_FIGURES[way].map((figure) => [
            figure.label,
            figureText(figure, bench.texts[keyOf(way, figure.name)] ?? ''),
          ])}
          source="Rectangular limits, common practice."
        >
          {assumed.map(field)}
        </AssumedFigures>
      )}
    </>
  );
}
