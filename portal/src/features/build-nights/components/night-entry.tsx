import Box from '@mui/material/Box';
import { countWord } from '../../../lib/text';
import { StateMark } from '../../../shared-ui/states/shape';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { BuildNight } from '../api/nights';
import type { Entry } from '../night-view';

interface NightEntryProps {
  entry: Entry;
  main: BuildNight['series'];
}

/** What stands in a night's box in the month: two lines, the first in bold. */
export function NightEntry({ entry, main }: NightEntryProps) {
  const { night, look, title } = entry;
  const time = entry.start.slice(11);
  if (!night) {
    return (
      <>
        <Line>
          <b>{time}</b>
          {look === 'clash' && (
            <Box component="b" sx={{ display: 'inline-flex', gap: '3px', ml: '8px', color: 'token.oxide' }}>
              <StateMark name="octagon" size={12} /> clash
            </Box>
          )}
        </Line>
        <Line>{title}</Line>
      </>
    );
  }
  const isCourse = night.series !== null && night.series.id === main?.id;
  const count = `${night.coming} of ${night.places}`;
  const waits = night.waiting > 0 ? `, ${countWord(night.waiting)} wait` : '';
  if (look === 'cancelled') {
    return (
      <>
        <Line>
          <b>Cancelled</b>
        </Line>
        <Line>
          <s>{isCourse ? `Night ${night.series?.number}` : title}</s>
        </Line>
      </>
    );
  }
  return (
    <>
      <Line>
        {isCourse ? (
          <>
            <VisuallyHidden>{`${time}, ${title}, `}</VisuallyHidden>
            <b>Night {night.series?.number}</b>
          </>
        ) : (
          <>
            <b>{time}</b> {count}
            {waits}
          </>
        )}
      </Line>
      <Line>{isCourse ? count + waits : title}</Line>
    </>
  );
}

function Line({ children }: { children: React.ReactNode }) {
  return (
    <Box
      component="span"
      sx={{ display: 'block', overflow: 'hidden', textOverflow: 'ellipsis', whiteSpace: 'nowrap' }}
    >
      {children}
    </Box>
  );
}
