import Box from '@mui/material/Box';
import { useOpeningHours } from '../../../api-client/club';
import { clubDay } from '../../../lib/club-time';
import { token } from '../../../shared-ui/tokens';
import type { BuildNight } from '../api/nights';
import { CLOSED_HATCH } from './month-grid-style';
import { ruleWords } from '../night-words';

interface LegendProps {
  nights: readonly BuildNight[];
  isPlanning: boolean;
}

const SERIES = {
  border: `1px solid ${token('green')}`,
  borderLeftWidth: 4,
  backgroundColor: token('greenTint'),
};
const ONE_OFF = { border: `1px solid ${token('edge')}`, backgroundColor: token('sheet') };
const CLOSED = { border: `1px solid ${token('rule')}`, backgroundImage: CLOSED_HATCH };
const PLANNED = { border: `1px dashed ${token('green')}` };
const CLASH = { border: `1px dashed ${token('oxide')}`, backgroundColor: token('oxideTint') };

/** What the boxes in the month mean, each series by its name and days. */
export function Legend({ nights, isPlanning }: LegendProps) {
  const hours = useOpeningHours();
  const isClosedSome = hours.length > 0 && hours.length < 7;
  const series = new Map<string, string>();
  for (const night of nights) {
    if (night.series) {
      series.set(
        night.series.id,
        `${night.series.title}, ${ruleWords(night.series.rule, clubDay(night.startsAt))}`,
      );
    }
  }
  return (
    <Box
      component="ul"
      aria-label="What the boxes mean"
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        gap: '4px 20px',
        m: 0,
        p: '10px 0 14px',
        listStyle: 'none',
        typography: 'small',
        color: 'token.ink2',
      }}
    >
      {[...series].map(([id, words]) => (
        <Item key={id} look={SERIES}>
          {words}
        </Item>
      ))}
      {nights.some((night) => !night.series) && <Item look={ONE_OFF}>One-off</Item>}
      {isClosedSome && <Item look={CLOSED}>Closed</Item>}
      {isPlanning && <Item look={PLANNED}>Being planned</Item>}
      {isPlanning && <Item look={CLASH}>Being planned, clashes</Item>}
    </Box>
  );
}

function Item({ look, children }: { look: object; children: React.ReactNode }) {
  return (
    <Box component="li" sx={{ display: 'flex', alignItems: 'center', gap: '8px' }}>
      <Box component="span" aria-hidden sx={{ width: 20, height: 13, borderRadius: '2px', ...look }} />
      {children}
    </Box>
  );
}
