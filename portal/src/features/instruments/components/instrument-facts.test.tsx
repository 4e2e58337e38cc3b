import { screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { describe, expect, it } from 'vitest';
import { renderPage } from '../../../testing/render';
import { server } from '../../../testing/server';
import type { Instrument } from '../api/instruments';
import { InstrumentFacts } from './instrument-facts';

const detector: Instrument = {
  ...{ id: 'i', tag: 'FR-041', name: 'Log detector', position: 1, condition: 'ready', conditionNote: '' },
  kind: { id: 'k', name: 'Log detector', needsClearance: false, needsCalibration: true },
  ...{ calibrationDueOn: '2026-12-09', damageLevelDbm: 15, amplitudeAccuracyDb: null },
  figures: { voltsPerDb: 0.025, interceptDbm: -85, validFromDbm: -70, validToDbm: 5, conformityDb: 0.5 },
  ...{ myClearance: null, mayBook: true, reasons: [] },
};

const show = (instrument: Instrument) => {
  server.use(
    http.get('*/api/instruments/i', () => HttpResponse.json({ ...instrument, clearedPeople: 0 })),
    http.get('*/api/instruments/i/history', () =>
      HttpResponse.json({ items: [], total: 0, page: 1, perPage: 50 }),
    ),
  );
  renderPage(<InstrumentFacts instrument={instrument} />);
};
const fact = (name: string) => screen.getByText(name).nextSibling?.textContent;

describe('what an instrument says of itself', () => {
  it('holds what readings are worked out with, and the level that harms it', async () => {
    show(detector);
    expect(await screen.findByText('Never above +15 dBm at the input.')).toBeVisible();
    expect(fact('Slope, each decibel')).toBe('25 mV');
    expect(fact('Intercept')).toBe('−85 dBm');
    expect(fact('The line holds up to')).toBe('5 dBm');
    expect(fact('Fit of its line')).toBe('± 0.5 dB');
    expect(screen.queryByText('Good to')).toBeNull();
  });

  it('says once how good its levels are', async () => {
    show({ ...detector, amplitudeAccuracyDb: 0.8, figures: { amplitudeAccuracyDb: 0.8, flatnessDb: 0.7 } });
    expect(await screen.findByText('Good to')).toBeVisible();
    expect(fact('Good to')).toBe('± 0.8 dB');
    expect(fact('Flatness')).toBe('± 0.7 dB');
    expect(screen.queryByText('Levels')).toBeNull();
  });

  it('says that nothing is stated where nothing is', async () => {
    show({ ...detector, figures: {} });
    expect(await screen.findByText('Good to')).toBeVisible();
    expect(fact('Good to')).toBe('not stated');
  });
});
