import fc from 'fast-check';
import table from '../../reference/mixers.json';
import { within } from '../../testing/within';
import { crossovers, mixingProducts, scanProducts } from '../index';

// Values, tolerances and sources: api/levels/reference/mixers.json, each row with its own source.

const MHZ = 1e6;
/** Megahertz are what the tables print; their tolerance is 1 Hz. */
const near = (hertz: number, megahertz: number) => within(hertz / MHZ, megahertz, 1e-6);

describe('products against complete enumerations', () => {
  it.each(table.products)('$id: LO $inputs.LO_MHz, IF $inputs.IF_MHz to order 7', ({ inputs, expected }) => {
    const products = mixingProducts({
      loHertz: inputs.LO_MHz * MHZ,
      ifHertz: inputs.IF_MHz * MHZ,
      maxOrder: inputs.max_order_m_plus_n,
    });
    expect(products).toHaveLength(expected.count);
    const [low = NaN, high = NaN] = inputs.band_MHz;
    const inBand = products.filter(({ hertz }) => hertz >= low * MHZ - 1 && hertz <= high * MHZ + 1);
    expect(inBand.map(({ loMultiple, ifMultiple, sign }) => [loMultiple, ifMultiple, sign])).toEqual(
      expected.in_band.map(({ m_LO, n_IF, sign }) => [m_LO, n_IF, sign]),
    );
    expected.all?.forEach(([megahertz, m, n, sign, order], index) => {
      const product = products[index];
      near(product?.hertz ?? NaN, Number(megahertz));
      expect([product?.loMultiple, product?.ifMultiple, product?.sign || '0', product?.order]).toEqual([
        m,
        n,
        sign,
        order,
      ]);
    });
  });

  it('equal brute force over every pair of multiples, at any order', () => {
    const frequency = fc.integer({ min: 1, max: 1e9 });
    fc.assert(
      fc.property(frequency, frequency, fc.integer({ min: 1, max: 15 }), (lo, intermediate, maxOrder) => {
        const brute: number[] = [];
        for (let m = -15; m <= 15; m++)
          for (let n = -15; n <= 15; n++) {
            const order = Math.abs(m) + Math.abs(n);
            // m·LO + n·IF and its negative are one product.
            const isFirst = m > 0 || (m === 0 && n > 0);
            if (isFirst && order >= 1 && order <= maxOrder) brute.push(Math.abs(m * lo + n * intermediate));
          }
        const found = mixingProducts({ loHertz: lo, ifHertz: intermediate, maxOrder }).map(
          ({ hertz }) => hertz,
        );
        expect(found).toEqual(brute.sort((a, b) => a - b));
      }),
    );
  });

  it.each(table.crossovers)(
    '$id: crossovers of IF $inputs.IF_MHz, $inputs.wanted',
    ({ inputs, expected }) => {
      const [low = NaN, high = NaN] = inputs.band_MHz;
      const found = crossovers({
        ifHertz: inputs.IF_MHz * MHZ,
        wanted: inputs.wanted === 'LO+IF' ? 'sum' : 'difference',
        bandLowHertz: low * MHZ,
        bandHighHertz: high * MHZ,
        maxOrder: inputs.max_order,
      });
      expect(found).toHaveLength(expected.crossovers.length);
      expected.crossovers.forEach((published, index) => {
        near(found[index]?.wantedHertz ?? NaN, published.RF_MHz);
        near(found[index]?.loHertz ?? NaN, published.LO_MHz);
        const { loMultiple, ifMultiple, order } = found[index] ?? {};
        expect([loMultiple, ifMultiple, order]).toEqual([published.m_LO, published.n_IF, published.order]);
      });
    },
  );

  it('crossovers are where two products of the list have one frequency', () => {
    const found = crossovers({
      ifHertz: 9e6,
      wanted: 'difference',
      bandLowHertz: 1.8e6,
      bandHighHertz: 30e6,
      maxOrder: 15,
    });
    expect(found.length).toBeGreaterThan(5);
    for (const { wantedHertz, loHertz, loMultiple, ifMultiple } of found) {
      const all = mixingProducts({ loHertz, ifHertz: 9e6, maxOrder: 15 });
      const same = all.filter(
        (product) => product.loMultiple === loMultiple && product.ifMultiple === ifMultiple,
      );
      const distances = same.map(({ hertz }) => Math.abs(hertz - wantedHertz));
      expect(Math.min(...distances)).toBeLessThan(1e-3);
    }
  });

  it('crossovers of a difference with the oscillator below', () => {
    const found = crossovers({
      ifHertz: 9e6,
      wanted: 'difference',
      loIsAbove: false,
      bandLowHertz: 2e6,
      bandHighHertz: 8e6,
      maxOrder: 5,
    });
    expect(found.map(({ loHertz }) => loHertz)).toContain(3e6);
    for (const { wantedHertz, loHertz } of found) within(9e6 - loHertz, wantedHertz, 1e-3);
  });
});

describe('whether a product turns the sideband', () => {
  it('is told of every product: it falls when the intermediate frequency rises exactly when inverted', () => {
    const frequency = fc.integer({ min: 1e6, max: 6e7 });
    fc.assert(
      fc.property(frequency, frequency, (lo, intermediate) => {
        const at = (ifHertz: number) => mixingProducts({ loHertz: lo, ifHertz, maxOrder: 7 });
        for (const { loMultiple, ifMultiple, sign, hertz, isInverted } of at(intermediate)) {
          if (ifMultiple === 0 || hertz < 100) continue;
          const raised = at(intermediate + 1).find(
            (other) =>
              other.loMultiple === loMultiple && other.ifMultiple === ifMultiple && other.sign === sign,
          );
          expect((raised?.hertz ?? NaN) < hertz).toBe(isInverted);
        }
      }),
      { numRuns: 30 },
    );
  });

  it('is in its name: the part that is subtracted stands last', () => {
    const names = (lo: number) =>
      mixingProducts({ loHertz: lo, ifHertz: 9e6, maxOrder: 3 }).map(({ name }) => name);
    expect(names(5e6)).toContain('IF − LO');
    expect(names(23e6)).toContain('LO − IF');
    expect(names(23e6)).toContain('2·LO − IF');
    expect(names(5e6)).toContain('2·IF − LO');
  });
});

describe('a scan over many settings', () => {
  it('finds the same products in the band as the list does, setting by setting', () => {
    const settings = fc.array(fc.integer({ min: 1e6, max: 6e7 }), { minLength: 1, maxLength: 20 });
    const wanteds = fc.constantFrom('sum' as const, 'difference' as const);
    const band = fc.tuple(fc.integer({ min: 1e6, max: 3e7 }), fc.integer({ min: 1000, max: 2e6 }));
    fc.assert(
      fc.property(
        settings,
        wanteds,
        band,
        fc.integer({ min: 2, max: 15 }),
        (los, wanted, [low, width], maxOrder) => {
          const scan = scanProducts({
            loHertz: Float64Array.from(los),
            ifHertz: 9e6,
            wanted,
            maxOrder,
            bandLowHertz: low,
            bandHighHertz: low + width,
          });
          los.forEach((loHertz, setting) => {
            const others = mixingProducts({ loHertz, ifHertz: 9e6, maxOrder }).filter(
              ({ hertz, loMultiple, ifMultiple, sign }) =>
                hertz >= low &&
                hertz <= low + width &&
                !(loMultiple === 1 && ifMultiple === 1 && sign === (wanted === 'sum' ? '+' : '-')),
            );
            expect(scan.inBand[setting]).toBe(others.length);
            const pair = scan.lowestOrder[setting] ?? NaN;
            const order =
              pair === -1 ? undefined : (scan.table.lo[pair] ?? 0) + Math.abs(scan.table.if[pair] ?? 0);
            expect(order).toBe(
              others.length === 0 ? undefined : Math.min(...others.map((other) => other.order)),
            );
          });
        },
      ),
    );
  });
});
