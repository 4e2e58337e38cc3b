import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { StateMark } from '../../../shared-ui/states/shape';
import { usePhone } from '../../../shared-ui/use-phone';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import type { BuildNight } from '../api/nights';
import type { Entry } from '../night-view';

interface NightEntryProps {
  entry: Entry;
  main: BuildNight['series'];
}

/** What stands in a night's box in the month: two lines, the first in bold. */
export function NightEntry({ entry, main }: NightEntryProps) {
  const isPhone = usePhone();
  const { night, look, title } = entry;
  const time = entry.start.slice(11);
  if (!night) return <PlannedEntry time={time} title={title} isClash={look === 'clash'} />;
  const number = night.series && night.series.id === main?.id ? night.series.number : undefined;
  const count = `${night.coming} of ${night.places}`;
  const waits = night.waiting > 0 ? `, ${night.waiting} wait` : '';
  const name = number === undefined ? title : `Night ${number}`;
  const spoken = `${time}, ${title}${number === undefined ? '' : ` ${name}`}, ${count}${waits}`;
  if (look === 'cancelled')
    return <Spoken words={`Cancelled, ${spoken}`} lines={[<b>Cancelled</b>, <s>{name}</s>]} />;
  if (isPhone) {
    const short = number === undefined ? time : `No ${number}`;
    return <Spoken words={spoken} lines={[<b>{short}</b>, `${night.coming}/${night.places}`]} />;
  }
  if (number !== undefined) return <Spoken words={spoken} lines={[<b>{name}</b>, count + waits]} />;
  const first = (
    <>
      <b>{time}</b> {count}
      {waits}
    </>
  );
  return <Spoken words={spoken} lines={[first, title]} />;
}

function PlannedEntry({ time, title, isClash }: { time: string; title: string; isClash: boolean }) {
  const first = (
    <>
      <b>{time}</b>
      {isClash && (
        <Box component="b" sx={{ display: 'inline-flex', gap: '2px', ml: '3px', color: 'token.oxide' }}>
          <StateMark name="octagon" size={12} /> clash
        </Box>
      )}
    </>
  );
  const words = `Being planned, ${time}, ${title}${isClash ? ', clashes' : ''}`;
  return <Spoken words={words} lines={[first, title]} />;
}

/** Two short lines for the eye, one whole sentence for the ear. */
function Spoken({ words, lines }: { words: string; lines: [ReactNode, ReactNode] }) {
  return (
    <>
      <VisuallyHidden>{words}</VisuallyHidden>
      <Line>{lines[0]}</Line>
      <Line>{lines[1]}</Line>
    </>
  );
}

function Line({ children }: { children: ReactNode }) {
  return (
    <Box
      component="span"
      aria-hidden
      sx={{ display: 'block', overflow: 'hidden', textOverflow: 'ellipsis', whiteSpace: 'nowrap' }}
    >
      {children}
    </Box>
  );
}
