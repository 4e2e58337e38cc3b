import type { DayCellContentArg, EventContentArg } from '@fullcalendar/core';
import dayGrid from '@fullcalendar/daygrid';
import interaction from '@fullcalendar/interaction';
import FullCalendar from '@fullcalendar/react';
import Box from '@mui/material/Box';
import { useMemo } from 'react';
import { useOpeningHours } from '../../../api-client/club';
import { clubDay } from '../../../lib/club-time';
import { closedAllDay } from '../../../lib/opening-hours';
import type { BuildNight } from '../api/nights';
import { mainSeries, type Entry } from '../night-view';
import { DayHead } from './day-head';
import { monthGridStyle } from './month-grid-style';
import { NightEntry } from './night-entry';

interface MonthGridProps {
  /** '2026-10-01' */
  month: string;
  nights: readonly BuildNight[];
  entries: readonly Entry[];
  /** Day of the night that is open below. */
  pickedDay?: string;
  onOpen: (nightId: string) => void;
  onDay: (day: string) => void;
  /** More on one day than its cell can hold. */
  onMore: () => void;
}

/** Days travel through the calendar as UTC, so that it does no arithmetic with zones of its own. */
const dayOf = (date: Date): string => date.toISOString().slice(0, 10);

/** The month, Monday to Sunday, on the day grid; days and times are those of the club's wall. */
export function MonthGrid({ month, nights, entries, pickedDay, onOpen, onDay, onMore }: MonthGridProps) {
  const main = useMemo(() => mainSeries(nights), [nights]);
  const hours = useOpeningHours();
  const today = clubDay();
  const nightDays = new Set(entries.map(({ start }) => start.slice(0, 10)));
  const head = ({ date }: DayCellContentArg) => {
    const day = dayOf(date);
    const word = day === today ? (nightDays.has(day) ? 'tonight' : 'today') : undefined;
    return <DayHead day={day} month={month} word={word} usual={nights} />;
  };
  const entry = ({ event }: EventContentArg) => (
    <NightEntry entry={event.extendedProps as Entry} main={main} />
  );
  return (
    <Box sx={monthGridStyle}>
      <FullCalendar
        key={month}
        plugins={[dayGrid, interaction]}
        initialView="dayGridMonth"
        initialDate={month}
        timeZone="UTC"
        now={today}
        firstDay={1}
        fixedWeekCount={false}
        headerToolbar={false}
        height="auto"
        dayHeaderFormat={{ weekday: 'short' }}
        dayMaxEvents={2}
        moreLinkContent={({ num }) => `${num} more`}
        moreLinkClick={onMore}
        // The library makes it a link that leads nowhere; pressed, it acts.
        moreLinkDidMount={({ el }) => el.setAttribute('role', 'button')}
        eventDisplay="block"
        eventInteractive
        eventOrder="start,title"
        events={entries.map(({ look, ...rest }) => ({
          ...rest,
          classNames: [`fr-${look}`],
          extendedProps: { ...rest, look },
        }))}
        eventContent={entry}
        eventClick={({ event }) => {
          if ((event.extendedProps as Entry).night) onOpen(event.id);
        }}
        dateClick={({ dateStr }) => onDay(dateStr)}
        dayCellContent={head}
        dayCellClassNames={({ date }) => [
          ...(closedAllDay(hours, dayOf(date)) ? ['fr-closed'] : []),
          ...(dayOf(date) === pickedDay ? ['fr-picked'] : []),
        ]}
      />
    </Box>
  );
}
