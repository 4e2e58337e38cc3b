import { screen, waitFor, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import { PutOnBuild } from './put-on-build';

const BUILD = {
  ...{ id: 'build', planName: 'Larkmoor Twenty', serial: 7, endedAt: null, currentStageId: 'stage-9' },
  stages: [
    { id: 'stage-8', position: 8, name: 'Mixer and band-pass', state: 'with mentor' },
    { id: 'stage-9', position: 9, name: 'Pre-driver', state: 'on the bench' },
  ],
};
const LINK = 'http://127.0.0.1:4782/level-bench/pads?attenuationDb=6';

function open(builds: unknown[] = [BUILD], text: string | undefined = 'Pi pad, 6 dB') {
  server.use(http.get('*/api/builds/mine/summary', () => HttpResponse.json(builds)));
  return renderPage(<PutOnBuild family="pads" link={() => LINK} text={text} />);
}

describe('putting a result on one’s build', () => {
  it('puts it on the stage that is on the bench, with what was typed, and says so', async () => {
    const sent: unknown[] = [];
    const { user } = open();
    server.use(
      http.post('*/api/builds/build/stages/stage-9/worksheets', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({ id: 'sheet' }, { status: 201 });
      }),
    );
    await user.click(await screen.findByRole('button', { name: 'Put this on my build' }));
    const dialog = await screen.findByRole('dialog');
    await user.click(within(dialog).getByRole('button', { name: 'Put it there' }));
    await waitFor(() =>
      expect(sent).toEqual([{ family: 'pads', inputs: 'attenuationDb=6', result: 'Pi pad, 6 dB' }]),
    );
    expect(await screen.findByText('Put on stage 9 Pre-driver.')).toBeVisible();
  });

  it('keeps the dialog and says why when it was not put there', async () => {
    const { user } = open();
    server.use(
      http.post('*/api/builds/build/stages/stage-9/worksheets', () =>
        HttpResponse.json(
          { type: '/problems/busy', title: 'Too much at once', status: 503 },
          { status: 503 },
        ),
      ),
    );
    await user.click(await screen.findByRole('button', { name: 'Put this on my build' }));
    await user.click(await screen.findByRole('button', { name: 'Put it there' }));
    expect(await screen.findByText(/It was not put there/)).toBeVisible();
  });

  it('is not offered to somebody who has no build under way', async () => {
    const { queryClient } = open([{ ...BUILD, endedAt: '2026-05-01T20:00:00Z' }]);
    await waitFor(() => expect(queryClient.isFetching()).toBe(0));
    expect(screen.queryByRole('button', { name: 'Put this on my build' })).not.toBeInTheDocument();
  });
});
