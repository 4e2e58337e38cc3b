import { describe, expect, it } from 'vitest';
import { bandMarks } from './band-marks';
import { marksOf, nearestMark, stepFrom } from './marks';
import { rowsOf } from './rows';
import { figuresOf, scaleOf } from './scale';
import { workOut } from './work-out';
import { valuesWith } from './work-out.test-values';

const mixing = workOut(valuesWith());
const { shown, rest } = rowsOf(mixing);
const scale = scaleOf({ width: 838, isPhone: false }, mixing.maxHertz, -10);
const marks = [...marksOf(shown, scale), ...marksOf(rest, scale)];

describe('the scale', () => {
  it('lets level plus filter be the level after it, in pixels', () => {
    const { y, yOfGain, top } = scale;
    expect(y(-16.5) + yOfGain(-66) - top).toBeCloseTo(y(-82.5), 9);
  });

  it('has a figure every 10 MHz, and fewer where they would meet', () => {
    expect(figuresOf(scale).map((hertz) => hertz / 1e6)).toEqual([0, 10, 20, 30, 40, 50]);
    const wide = figuresOf(scaleOf({ width: 390, isPhone: true }, 500e6, 0));
    expect(wide.length).toBeLessThanOrEqual(10);
  });

  it('begins higher for a mixer that puts out more than a milliwatt', () => {
    const strong = scaleOf({ width: 838, isPhone: false }, 50e6, 3);
    expect(strong.topDbm).toBe(20);
    expect(strong.y(3)).toBeGreaterThan(strong.top);
  });
});

describe('marks', () => {
  it('leave out what is beyond the axis or too weak to be drawn', () => {
    expect(marks.every(({ row }) => row.product.hertz <= 50e6 && row.product.levelDbm > -120)).toBe(true);
    expect(marks.some(({ row }) => row.product.name === '3·LO + IF')).toBe(false);
  });

  it('stand off the scale at its foot', () => {
    const leak = marks.find(({ row }) => row.product.name === 'IF');
    expect(leak).toMatchObject({ isOff: true, yEnd: scale.bottom });
  });
});

describe('keys', () => {
  it('step by frequency to the sides and stay at the ends', () => {
    expect(stepFrom(marks, 'IF', 'right')).toBe('4·IF − LO');
    const first = stepFrom(marks, undefined, 'first');
    expect(stepFrom(marks, first, 'left')).toBe(first);
    const last = stepFrom(marks, undefined, 'last');
    expect(stepFrom(marks, last, 'right')).toBe(last);
  });

  it('step in the order of the table up and down, from its first row', () => {
    const first = stepFrom(marks, undefined, 'down');
    expect(first).toBe('LO − IF');
    expect(stepFrom(marks, first, 'down')).toBe('LO + IF');
    expect(stepFrom(marks, 'LO + IF', 'up')).toBe('LO − IF');
  });
});

describe('a press', () => {
  it('means the nearest stem, and nothing far from all', () => {
    const sum = marks.find(({ row }) => row.product.name === 'LO + IF');
    expect(nearestMark(marks, (sum?.x ?? 0) + 4, (sum?.yTick ?? 0) + 20)?.row.product.name).toBe('LO + IF');
    expect(nearestMark(marks, scale.left, scale.top)).toBeUndefined();
  });
});

describe('bands under the axis', () => {
  it('name the wanted band before any that would cover its name', () => {
    const narrow = scaleOf({ width: 200, isPhone: true }, 50e6, 0);
    const named = bandMarks(mixing.bands, mixing.band, narrow).filter(({ isNamed }) => isNamed);
    expect(named.map(({ name }) => name)).toContain('20');
    const at = named.map((mark) => mark.at);
    expect(at.every((x, index) => index === 0 || x - at[index - 1] >= 19)).toBe(true);
  });
});
