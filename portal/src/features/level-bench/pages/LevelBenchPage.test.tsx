import { waitFor } from '@testing-library/react';
import { expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import LevelBenchPage from './LevelBenchPage';

it('opens an old address of a reading where the readings are now, with all of it', async () => {
  const { router } = renderPage(<LevelBenchPage />, {
    at: '/level-bench?way=analyzer&divisionsDown=1.65',
    path: '/level-bench',
  });
  await waitFor(() => expect(router.state.location.pathname).toBe('/level-bench/readings'));
  expect(router.state.location.search).toBe('?way=analyzer&analyzer.divisionsDown=1.65');
});
