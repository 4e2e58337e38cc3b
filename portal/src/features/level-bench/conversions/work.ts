import type { ConversionValues } from './inputs';
import { workLevel } from './level';
import { workLoaded } from './loaded';
import { workRatio } from './ratio';
import type { ConversionSheet } from './sheet';
import { workSum } from './sum';

const WORK: Record<ConversionValues['calculation'], (values: ConversionValues) => ConversionSheet> = {
  level: workLevel,
  ratio: workRatio,
  sum: workSum,
  loaded: workLoaded,
};

/** The conversion that is chosen. */
export const work = (values: ConversionValues): ConversionSheet => WORK[values.calculation](values);
