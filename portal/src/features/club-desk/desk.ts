import type { Licence } from './api/licences';
import type { Person } from './api/people';

/** One person's line on the desk. */
export interface DeskRow {
  person: Person;
  /** Of their builds under way; none for who builds nothing. */
  licences: readonly Licence[];
}

export const SHOWN = ['everyone', 'mentor', 'steward', 'treasurer', 'organiser', 'licence'] as const;
export type Shown = (typeof SHOWN)[number];

const WORDS: Record<Shown, string> = {
  everyone: 'Everyone',
  mentor: 'Mentors',
  steward: 'Stewards',
  treasurer: 'Treasurers',
  organiser: 'Organisers',
  licence: 'Licence not seen',
};

const isOpen = ({ seenAt }: Licence): boolean => seenAt === null;

const belongs = ({ person, licences }: DeskRow, shown: Shown): boolean => {
  if (shown === 'everyone') return true;
  return shown === 'licence' ? licences.some(isOpen) : person.roles.includes(shown);
};

export function deskRows(people: readonly Person[], licences: readonly Licence[]): DeskRow[] {
  return people.map((person) => ({
    person,
    licences: licences.filter(({ builder }) => builder.id === person.id),
  }));
}

export const rowsShown = (rows: readonly DeskRow[], shown: Shown, name: string): DeskRow[] =>
  rows.filter((row) => belongs(row, shown) && row.person.name.toLowerCase().includes(name.toLowerCase()));

/** The words above the table, each with its count. */
export const shownOptions = (rows: readonly DeskRow[]) =>
  SHOWN.map((value) => ({
    value,
    words: `${WORDS[value]}, ${rows.filter((row) => belongs(row, value)).length}`,
  }));

/** Who alone holds a role: it cannot be taken from them. */
export function lastHolders(rows: readonly DeskRow[]): string[] {
  return (['organiser', 'treasurer', 'steward', 'mentor'] as const).flatMap((role) => {
    const holders = rows.filter(({ person }) => person.roles.includes(role));
    return holders.length === 1 ? [`${holders[0].person.name} is the only ${role}`] : [];
  });
}
