import type { EntryField } from '@ferrite-row/levels';
import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useSearchParams } from 'react-router-dom';
import { QuantityField } from '../../../shared-ui/fields/quantity-field';
import { ToggleField } from '../../../shared-ui/fields/toggle-field';
import { PageTitle } from '../../../shared-ui/page-title';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { fieldsOf, STARTS, WAYS, workOut, type Way } from '../readings';

const NAMES: Record<Way, string> = { oscilloscope: 'Oscilloscope', analyzer: 'Spectrum analyzer' };

/** What an instrument shows, turned into dBm. The address holds what was typed, so that it can be sent to somebody. */
export default function LevelBenchPage() {
  const [search, setSearch] = useSearchParams();
  const way = WAYS.find((known) => known === search.get('way')) ?? 'oscilloscope';
  const entry = Object.fromEntries(
    fieldsOf(way).map(({ name }) => [name, search.get(name) ?? STARTS[way][name] ?? '']),
  );
  const type = (name: string, text: string) =>
    setSearch(
      (before) => new URLSearchParams([...[...before].filter(([key]) => key !== name), [name, text]]),
      {
        replace: true,
      },
    );
  const worked = workOut(way, entry);
  return (
    <>
      <PageTitle tab="Level bench">
        Level <b>bench</b>
      </PageTitle>
      <Box
        sx={{ display: 'grid', gridTemplateColumns: { xs: '1fr', md: '420px 1fr' }, gap: '30px', mt: '18px' }}
      >
        <Box
          component="section"
          aria-label="What the instrument shows"
          sx={{ display: 'grid', gap: '14px', alignContent: 'start' }}
        >
          <ToggleField
            label="Read on the"
            value={way}
            options={WAYS.map((value) => ({ value, label: NAMES[value] }))}
            onChange={(next) => setSearch({ way: next }, { replace: true })}
          />
          {fieldsOf(way).map((field) => (
            <Typed key={`${way} ${field.name}`} field={field} value={entry[field.name] ?? ''} onType={type} />
          ))}
        </Box>
        <Box component="section" aria-label="Level">
          <SectionHeading>Level</SectionHeading>
          <Box aria-live="polite" sx={{ mt: '12px' }}>
            {'level' in worked ? (
              <>
                <Typography variant="reading">{worked.level}</Typography>
                <Typography sx={{ color: 'token.ink2' }}>{worked.beside}</Typography>
              </>
            ) : (
              <Typography sx={{ color: 'token.ink3' }}>{worked.why}</Typography>
            )}
          </Box>
        </Box>
      </Box>
    </>
  );
}

interface TypedProps {
  field: EntryField;
  value: string;
  onType: (name: string, text: string) => void;
}

function Typed({ field: { name, label, unit, choices }, value, onType }: TypedProps) {
  const onChange = (text: string) => onType(name, text);
  if (!choices) return <QuantityField label={label} unit={unit} value={value} onChange={onChange} />;
  const options = choices.map((choice) => ({ value: String(choice), label: `×${choice}` }));
  return <ToggleField label={label} value={value} options={options} onChange={onChange} />;
}
