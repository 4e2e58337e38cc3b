import { token } from '../../../shared-ui/tokens';

const HATCH = (name: 'rule' | 'oxide') =>
  `repeating-linear-gradient(135deg, transparent 0 6px, ${token(name)} 6px 7px)`;

/** A day on which nobody opens the workshop, in the month and in its legend. */
export const CLOSED_HATCH = HATCH('rule');

/** Dresses the calendar's own classes in the notebook's look; it brings its rules along and cannot be themed else. */
export const monthGridStyle = {
  '& .fc': {
    '--fc-border-color': token('rule'),
    '--fc-today-bg-color': 'transparent',
    '--fc-page-bg-color': 'transparent',
    '--fc-event-text-color': token('ink'),
    borderBottom: `1px solid ${token('rule')}`,
  },
  '& .fc .fc-scrollgrid': { border: 0 },
  '& .fc .fc-scroller': { overflow: 'visible !important' },
  '& .fc .fc-scrollgrid-section > td, & .fc .fc-scrollgrid-section > th': { border: 0 },
  '& .fc .fc-col-header-cell': {
    border: 0,
    borderBottom: `1.5px solid ${token('ink')}`,
    textAlign: 'left',
    color: token('ink2'),
    fontSize: '0.8125rem',
    fontWeight: 600,
  },
  '& .fc .fc-col-header-cell-cushion': { padding: '4px 7px', color: 'inherit' },
  '& .fc .fc-daygrid-day-frame': { minHeight: 106, padding: '4px 0 2px' },
  '& .fc .fc-daygrid-day-top': { flexDirection: 'row', opacity: 1 },
  '& .fc .fc-daygrid-day-number': { width: '100%', padding: '0 7px', color: token('ink2') },
  '& .fc .fc-day-other .fc-daygrid-day-number': { color: token('ink3') },
  // Drawn inside: the table's collapsed borders would take its place.
  '& .fc .fc-day-today': { boxShadow: `inset 0 3px 0 ${token('green')}` },
  '& .fc td.fc-daygrid-day:first-of-type': { borderLeft: `1px solid ${token('rule')}` },
  '& .fc td.fc-daygrid-day:last-of-type': { borderRight: `1px solid ${token('rule')}` },
  '& .fc .fr-closed': { backgroundImage: CLOSED_HATCH },
  '& .fc .fr-picked': {
    backgroundImage: 'none',
    backgroundColor: token('sheet'),
    outline: `1.5px solid ${token('ink')}`,
    outlineOffset: '-1.5px',
  },
  '& .fc .fc-daygrid-event': {
    margin: { xs: '2px 1px 0 !important', md: '2px 5px 0 !important' },
    padding: { xs: '1px 2px 2px', md: '1px 4px 2px' },
    minHeight: 36,
    borderRadius: '2px',
    border: `1px solid ${token('edge')}`,
    backgroundColor: token('sheet'),
    color: token('ink'),
    fontSize: '0.75rem',
    lineHeight: '1rem',
    cursor: 'pointer',
    whiteSpace: 'normal',
  },
  '& .fc .fc-daygrid-event:hover': { borderColor: token('ink') },
  '& .fc .fc-daygrid-event:focus-visible': { outline: `2px solid ${token('green')}`, outlineOffset: 1 },
  '& .fc .fc-daygrid-event::after, & .fc .fc-daygrid-event::before': { display: 'none' },
  '& .fc .fr-series': {
    borderColor: token('green'),
    borderLeftWidth: 4,
    backgroundColor: token('greenTint'),
  },
  '& .fc .fr-planned': {
    borderStyle: 'dashed',
    borderColor: token('green'),
    backgroundColor: 'transparent',
    cursor: 'default',
  },
  '& .fc .fr-clash': {
    borderStyle: 'dashed',
    borderColor: token('oxide'),
    backgroundColor: token('oxideTint'),
    cursor: 'default',
  },
  '& .fc .fr-cancelled': { borderStyle: 'dashed', color: token('ink3'), backgroundImage: HATCH('rule') },
  '& .fc .fc-daygrid-more-link': {
    margin: '1px 5px',
    color: token('green'),
    fontSize: '0.75rem',
    fontWeight: 700,
  },
} as const;
