import type { Role } from '../api-client/session';
import type { IconName } from '../shared-ui/icon';

export interface PageLink {
  path: string;
  words: string;
  icon: IconName;
  /** After `G` it leads there. */
  letter?: string;
}

/** Everyone's pages, in the order of the rail. */
export const OWN_PAGES = [
  { path: '/', words: 'Tonight', icon: 'tonight', letter: 't' },
  { path: '/build', words: 'My build', icon: 'build', letter: 'b' },
  { path: '/bench-book', words: 'Bench book', icon: 'benchBook', letter: 'k' },
  { path: '/build-nights', words: 'Build nights', icon: 'buildNights', letter: 'n' },
  { path: '/groups', words: 'Groups', icon: 'groups' },
  { path: '/instruments', words: 'Instruments', icon: 'instruments', letter: 'i' },
  { path: '/level-bench', words: 'Level bench', icon: 'levelBench', letter: 'l' },
  { path: '/dues', words: 'Dues', icon: 'dues', letter: 'd' },
] as const satisfies readonly PageLink[];

export interface RolePages {
  role: Exclude<Role, 'member'>;
  words: string;
  pages: readonly PageLink[];
}

/** Shown under the role's name, and only to those who hold it. */
export const ROLE_PAGES: readonly RolePages[] = [
  {
    role: 'organiser',
    words: 'Organiser',
    pages: [{ path: '/club-desk', words: 'Club desk', icon: 'clubDesk' }],
  },
  {
    role: 'treasurer',
    words: 'Treasurer',
    pages: [{ path: '/treasury', words: 'Treasury', icon: 'treasury' }],
  },
  {
    role: 'steward',
    words: 'Steward',
    pages: [{ path: '/instrument-desk', words: 'Instrument desk', icon: 'instruments' }],
  },
  { role: 'mentor', words: 'Mentor', pages: [{ path: '/review', words: 'Review queue', icon: 'review' }] },
];

/** The four with a place of their own in the phone's bottom bar; the rest are under More. */
export const BOTTOM_PATHS: readonly string[] = ['/', '/build', '/bench-book', '/level-bench'];

/** A person's roles in words: 'Member', or 'Mentor, organiser'. */
export function roleWords(roles: readonly Role[]): string {
  const held = roles.filter((role) => role !== 'member').join(', ');
  return held ? held.charAt(0).toUpperCase() + held.slice(1) : 'Member';
}

/** Whether a page of the rail is the one being shown; Tonight only at exactly '/'. */
export const isAt = (path: string, pathname: string): boolean =>
  path === '/' ? pathname === '/' : pathname === path || pathname.startsWith(`${path}/`);
