import { describe, expect, it } from 'vitest';
import { nearestIndex, plotFrequencies } from './frequencies';
import { histogramOf } from './histogram';
import { bandPath, GAIN, gainToY, linePath, RETURN, returnToY } from './plot-scale';
import { nextStop } from './response-rows';
import { layOut } from './schematic-layout';

const AXIS = { endHertz: 60e6, stepHertz: 10e6 };
const asIs = (value: number) => value;

describe('the filter plot', () => {
  it('runs from 0 to −70 dB and, under it, from 0 to 40 dB of return loss', () => {
    expect([gainToY(0), gainToY(-70)]).toEqual([GAIN.top, GAIN.bottom]);
    expect([returnToY(0), returnToY(40)]).toEqual([RETURN.top, RETURN.bottom]);
    expect(gainToY(-200)).toBeLessThan(GAIN.bottom + 12);
  });

  it('draws a line from left to right, and a band there and back', () => {
    const hertz = Float64Array.of(1, 2);
    expect(linePath(hertz, Float64Array.of(3, 4), asIs, asIs)).toBe('M1.0 3.0L2.0 4.0');
    expect(bandPath(hertz, Float64Array.of(3, 4), Float64Array.of(5, 6), asIs, asIs)).toBe(
      'M1.0 3.0L2.0 4.0L2.0 6.0L1.0 5.0Z',
    );
  });

  it('has a point at every frequency that matters and every finer step, each once and rising', () => {
    const hertz = plotFrequencies(AXIS, [28e6, 14.35e6]);
    expect([1e6, 10e6, 28e6, 14.35e6, 60e6].map((one) => hertz.includes(one))).not.toContain(false);
    expect(hertz.every((one, index) => index === 0 || one > hertz[index - 1])).toBe(true);
    expect(hertz[nearestIndex(hertz, 14.36e6)]).toBe(14.35e6);
  });

  it('is walked by steps, by tenths of them, and from limit to limit', () => {
    const limits = [28e6, 42e6, 56e6].map((hertz) => ({ name: '', hertz, neededDb: 0, takenDb: 0 }));
    const next = (at: number | undefined, key: string, isFine = false) =>
      nextStop({ axis: AXIS, limits }, at, key, isFine);
    expect(next(undefined, 'ArrowRight')).toBe(10e6);
    expect(next(28e6, 'ArrowRight')).toBe(30e6);
    expect(next(28e6, 'ArrowLeft')).toBe(20e6);
    expect(next(28e6, 'ArrowRight', true)).toBe(29e6);
    expect(next(60e6, 'ArrowRight')).toBe(60e6);
    expect(next(28e6, 'h')).toBe(42e6);
    expect(next(56e6, 'h')).toBe(28e6);
    expect(next(28e6, 'x')).toBeUndefined();
  });
});

describe('the histogram', () => {
  it('counts every build once, in bars of a round width', () => {
    const { from, step, counts } = histogramOf(Float64Array.of(24.07, 24.4, 25.1, 26, 27.9));
    expect([from, step]).toEqual([24, 0.5]);
    expect(counts).toEqual([2, 0, 1, 0, 1, 0, 0, 1]);
  });

  it('stands when every build is the same', () => {
    expect(histogramOf(Float64Array.of(20, 20, 20)).counts).toEqual([3]);
  });
});

describe('the circuit', () => {
  const elements = (count: number) => Array.from({ length: count }, () => ({}) as never);

  it('keeps its elements between its ends, in order', () => {
    const { from, to, placed } = layOut({ elements: elements(9) }, 836);
    const xs = placed.map(({ x }) => x);
    expect(xs).toEqual([...xs].sort((a, b) => a - b));
    expect(xs[0]).toBeGreaterThan(from);
    expect(xs[8]).toBeLessThan(to);
  });

  it('fills its frame, and grows past it rather than set values over one another', () => {
    expect(layOut({ elements: elements(5) }, 836).width).toBe(836);
    const { placed, width } = layOut({ elements: elements(9) }, 358);
    expect(width).toBeGreaterThan(358);
    expect(placed[1].x - placed[0].x).toBeGreaterThanOrEqual(74);
  });
});
