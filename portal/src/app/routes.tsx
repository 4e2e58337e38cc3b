import type { ComponentType } from 'react';
import type { RouteObject } from 'react-router-dom';
import { ErrorPage } from './error-page';
import { NotFoundPage } from './not-found-page';
import { RequireRole } from './require-role';
import { RequireSession } from './require-session';

type Load = () => Promise<{ default: ComponentType }>;

/** Each page is a chunk of its own. */
const page = (path: string, load: Load): RouteObject => ({
  path,
  lazy: async () => ({ Component: (await load()).default }),
});

const ROLE_ROUTES: RouteObject[] = [
  {
    element: (
      <RequireRole
        role="mentor"
        page="Review queue"
        forWhom="Review is for mentors."
        instead="Your own stages are under My build."
      />
    ),
    children: [page('review', () => import('../features/builds/pages/ReviewPage'))],
  },
  {
    element: (
      <RequireRole
        role="steward"
        page="Instrument desk"
        forWhom="The instrument desk is for stewards."
        instead="What is here and what is yours to use is under Instruments."
      />
    ),
    children: [page('instrument-desk', () => import('../features/instruments/pages/InstrumentDeskPage'))],
  },
  {
    element: (
      <RequireRole
        role="treasurer"
        page="Treasury"
        forWhom="Treasury is for treasurers."
        instead="Your own payments are under Dues."
      />
    ),
    children: [
      page('treasury', () => import('../features/treasury/pages/TreasuryPage')),
      page('treasury/reconcile/:statementId', () => import('../features/treasury/pages/ReconcilePage')),
    ],
  },
  {
    element: (
      <RequireRole
        role="organiser"
        page="Club desk"
        forWhom="The club desk is for organisers."
        instead="Your own details are under You."
      />
    ),
    children: [page('club-desk', () => import('../features/club-desk/pages/ClubDeskPage'))],
  },
];

const PAGES: RouteObject[] = [
  { index: true, lazy: async () => ({ Component: (await import('./tonight/TonightPage')).default }) },
  page('build', () => import('../features/builds/pages/MyBuildPage')),
  page('build/:buildId/stages/:stageId', () => import('../features/builds/pages/StagePage')),
  page('build/:buildId/levels', () => import('../features/builds/pages/LevelPage')),
  page('bench-book', () => import('../features/bench-book/pages/BenchBookPage')),
  page('build-nights', () => import('../features/build-nights/pages/BuildNightsPage')),
  page('groups', () => import('../features/groups/pages/GroupsPage')),
  page('instruments', () => import('../features/instruments/pages/InstrumentsPage')),
  page('level-bench', () => import('../features/level-bench/pages/LevelBenchPage')),
  page('level-bench/conversions', () => import('../features/level-bench/pages/ConversionsPage')),
  page('level-bench/pads', () => import('../features/level-bench/pages/PadsPage')),
  page('level-bench/matching', () => import('../features/level-bench/pages/MatchingPage')),
  page('level-bench/mixing', () => import('../features/level-bench/pages/MixingPage')),
  page('level-bench/readings', () => import('../features/level-bench/pages/ReadingsPage')),
  page('level-bench/chain', () => import('../features/level-bench/pages/ChainPage')),
  page('level-bench/guards', () => import('../features/level-bench/pages/GuardsPage')),
  page('level-bench/filters', () => import('../features/level-bench/pages/FiltersPage')),
  page('dues', () => import('../features/dues/pages/DuesPage')),
  page('you', () => import('../features/you/pages/YouPage')),
  ...ROLE_ROUTES,
  { path: '*', element: <NotFoundPage /> },
];

export const routes: RouteObject[] = [
  {
    errorElement: <ErrorPage />,
    hydrateFallbackElement: <></>,
    children: [
      page('sign-in', () => import('../features/session/pages/SignInPage')),
      { element: <RequireSession />, children: [{ errorElement: <ErrorPage />, children: PAGES }] },
    ],
  },
];
