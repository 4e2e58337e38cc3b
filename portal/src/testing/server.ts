import { http, HttpResponse } from 'msw';
import { setupServer } from 'msw/node';

const CLUB = {
  ...{
    name: 'Larkmoor Radio Builders',
    address: 'Millbeck Hall, Larkmoor',
    contactEmail: 'desk@larkmoor.example',
  },
  ...{ timeZone: 'Europe/London', currency: 'GBP', ruleSet: 'IARU-R1', openingHours: [], demoAccounts: [] },
};

/**
 * Answers at the network's edge; each test adds what it needs with `server.use(...)`. What the rail asks for on every
 * page, and what stands on every stage, is answered with nothing.
 */
export const server = setupServer(
  http.get('*/api/club', () => HttpResponse.json(CLUB)),
  http.get('*/api/builds/mine', () => HttpResponse.json([])),
  http.get('*/api/builds/:buildId/worksheets', () => HttpResponse.json([])),
  http.get('*/api/builds/mine/summary', () => HttpResponse.json([])),
  http.get('*/api/invoices/mine', () => HttpResponse.json([])),
  http.get('*/api/reviews', () =>
    HttpResponse.json({ items: [], total: 0, page: 1, perPage: 100, lastSignOffAt: null }),
  ),
);
