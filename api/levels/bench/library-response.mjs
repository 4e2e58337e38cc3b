// A ladder's response the way one writes it with a general complex-number library: a new object for every number, a
// matrix for every element.
import Complex from 'complex.js';

/** Gain over frequency, dB; coils of a finite Q, capacitors without loss. */
export function libraryResponse(ladder, hertz, inductorQ) {
  const number = (re, im = 0) => new Complex(re, im);
  const { sourceOhms, loadOhms } = ladder;
  return Array.from(hertz, (frequency) => {
    const omega = 2 * Math.PI * frequency;
    const unit = [number(1), number(0), number(0), number(1)];
    const [a, b, c, d] = ladder.elements.reduce((m, { place, part, value }) => {
      const x = omega * value;
      const z = part === 'inductor' ? number(x / inductorQ, x) : number(0, -1 / x);
      const n =
        place === 'series'
          ? [number(1), z, number(0), number(1)]
          : [number(1), number(0), z.inverse(), number(1)];
      return [
        m[0].mul(n[0]).add(m[1].mul(n[2])),
        m[0].mul(n[1]).add(m[1].mul(n[3])),
        m[2].mul(n[0]).add(m[3].mul(n[2])),
        m[2].mul(n[1]).add(m[3].mul(n[3])),
      ];
    }, unit);
    const load = number(1 / loadOhms);
    const sum = a.add(b.mul(load)).add(number(sourceOhms).mul(c.add(d.mul(load))));
    return 10 * Math.log10((4 * sourceOhms) / loadOhms / sum.abs() ** 2);
  });
}
