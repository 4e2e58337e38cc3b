import {
  crossovers,
  receiveImage,
  scanProducts,
  type AmateurBand,
  type Conversion,
  type Crossover,
  type ReceiveImage,
} from '@ferrite-row/levels';
import type { MixingValues } from './inputs';

/** What happens while the oscillator tunes the wanted product over its band. */
export interface Tuning {
  /** Where another product lands on the wanted one. */
  crossings: Crossover[];
  /** Settings tried, and at how many another product lies somewhere in the band. */
  settings: number;
  troubled: number;
  /** The most of them at one setting. */
  mostAtOnce: number;
  /** Of the oscillator, from one edge of the band to the other; none where no oscillator reaches all of it. */
  loHertz?: [number, number];
  /** The same oscillator and IF turned round, as a receiver. */
  receive?: ReceiveImage;
}

const SETTINGS = 501;

/** The oscillator that puts the wanted product on a frequency; `loIsAbove` for a difference. */
function loFor(hertz: number, { ifHertz, wanted }: MixingValues, loIsAbove: boolean): number {
  if (wanted === 'sum') return hertz - ifHertz;
  return loIsAbove ? hertz + ifHertz : ifHertz - hertz;
}

export function tuningOf(values: MixingValues, conversion: Conversion, band: AmateurBand): Tuning {
  const { ifHertz, maxOrder, wanted } = values;
  const loIsAbove = values.loHertz > ifHertz;
  const over = { bandLowHertz: band.lowHertz, bandHighHertz: band.highHertz, ifHertz, maxOrder, wanted };
  const ends = [loFor(band.lowHertz, values, loIsAbove), loFor(band.highHertz, values, loIsAbove)];
  const [from, to] = [Math.min(...ends), Math.max(...ends)];
  const tuned = from > 0 ? { loHertz: [from, to] as [number, number], ...scanned(over, from, to) } : NONE;
  const receive = receiveOf(values, conversion);
  return { crossings: crossovers({ ...over, loIsAbove }), ...tuned, ...(receive && { receive }) };
}

const NONE = { settings: 0, troubled: 0, mostAtOnce: 0 };

function scanned(over: Omit<Parameters<typeof scanProducts>[0], 'loHertz'>, from: number, to: number) {
  const step = (to - from) / (SETTINGS - 1);
  const loHertz = Float64Array.from({ length: SETTINGS }, (_one, index) => from + index * step);
  const { inBand } = scanProducts({ ...over, loHertz });
  return {
    settings: SETTINGS,
    troubled: inBand.filter((count) => count > 0).length,
    mostAtOnce: Math.max(...inBand),
  };
}

/** A receiver's oscillator is the signal and its IF added or subtracted; an oscillator below both is not one of those. */
function receiveOf({ ifHertz, wanted, loHertz }: MixingValues, conversion: Conversion) {
  if (wanted === 'difference' && loHertz < ifHertz) return undefined;
  const injection = wanted === 'sum' ? 'low side' : 'high side';
  return receiveImage({ signalHertz: conversion.hertz, ifHertz, injection });
}
