import { afterEach, vi } from 'vitest';
import { setClubCurrency } from '../lib/club-currency';
import { setClubZone } from '../lib/club-zone';

// Spec files share a process and its modules, so each spec leaves them as it found them.
afterEach(() => {
  vi.useRealTimers();
  setClubCurrency('GBP');
  setClubZone('Europe/London');
});
