import fc from 'fast-check';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { simulatedLadder } from '../../testing/simulated-ladder';
import { within } from '../../testing/within';
import { ladderResponse, lNetworkLoss, lNetworks } from '../index';

const resistance = between(1, 2000);
const reactance = between(-500, 500);

describe('L-networks of real parts', () => {
  it('lose what the ladder of the same parts loses, for every load without reactance', () => {
    fc.assert(
      fc.property(
        resistance,
        resistance,
        between(20, 1000),
        between(20, 5000),
        (sourceOhms, r, inductorQ, capacitorQ) => {
          fc.pre(Math.abs(r / sourceOhms - 1) > 1e-3);
          const match = { sourceOhms, load: { resistanceOhms: r, reactanceOhms: 0 }, frequencyHertz: 7e6 };
          for (const network of lNetworks(match)) {
            const ladder = { elements: network.elements, sourceOhms, loadOhms: r };
            const { gainDb } = ladderResponse(ladder, Float64Array.of(7e6), { inductorQ, capacitorQ });
            const { lossDb, partsDb } = lNetworkLoss(network, match, { inductorQ, capacitorQ });
            expect(lossDb).toBeCloseTo(-(gainDb[0] ?? NaN), 6);
            expect(partsDb).toBeLessThanOrEqual(lossDb + 1e-12);
          }
        },
      ),
    );
  });

  it('lose nothing in parts without loss, whatever the load’s reactance', () => {
    fc.assert(
      fc.property(resistance, resistance, reactance, (sourceOhms, r, x) => {
        fc.pre(Math.abs(r / sourceOhms - 1) > 1e-3);
        const match = { sourceOhms, load: { resistanceOhms: r, reactanceOhms: x }, frequencyHertz: 7e6 };
        for (const network of lNetworks(match))
          expect(lNetworkLoss(network, match, {}).lossDb).toBeCloseTo(0, 6);
      }),
    );
  });

  it('lose about their Q over the coil’s in the coil', () => {
    const match = { sourceOhms: 50, load: { resistanceOhms: 2, reactanceOhms: 0 }, frequencyHertz: 7e6 };
    for (const network of lNetworks(match)) {
      const { partsDb } = lNetworkLoss(network, match, { inductorQ: 200 });
      // Textbook, for parts much better than the network: the coil takes Q/Qcoil of the power.
      within(partsDb, 10 * Math.log10(1 + network.q / 200), 0.01);
    }
  });

  it.each([12.5, 200, 1000])('to %d ohm, simulated in ngspice, agree within 0.01 dB', (resistanceOhms) => {
    const match = { sourceOhms: 50, load: { resistanceOhms, reactanceOhms: 0 }, frequencyHertz: 14.2e6 };
    const q = { inductorQ: 60, capacitorQ: 500 };
    for (const { elements } of lNetworks(match)) {
      const ladder = { elements, sourceOhms: 50, loadOhms: resistanceOhms };
      const [centre] = simulatedLadder(ladder, [14.2e6], q);
      within(lNetworkLoss({ elements }, match, q).lossDb, -(centre?.gainDb ?? NaN), 0.01);
    }
  });

  it('are refused a Q of nothing and a load without resistance, by name', () => {
    const match = { sourceOhms: 50, load: { resistanceOhms: 12.5, reactanceOhms: 0 }, frequencyHertz: 7e6 };
    const [network = { elements: [] }] = lNetworks(match);
    expect(errorOf(() => lNetworkLoss(network, match, { inductorQ: 0 })).input).toBe('inductorQ');
    expect(errorOf(() => lNetworkLoss(network, match, { capacitorQ: NaN })).input).toBe('capacitorQ');
    const open = { ...match, load: { resistanceOhms: 0, reactanceOhms: 5 } };
    expect(errorOf(() => lNetworkLoss(network, open, {})).input).toBe('resistanceOhms');
  });
});
