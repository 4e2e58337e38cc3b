import {
  ASSUMED,
  ASSUMED_METER_ACCURACY_REL,
  ASSUMED_PAD_TOLERANCE_DB,
  ASSUMED_RISE_REL,
  ASSUMED_SCOPE_LIMITS,
  ASSUMED_TIME_BASE_REL,
  formatQuantity,
  type QuantityUnit,
} from '@ferrite-row/levels';
import { typedQuantity } from '../../../lib/quantity';
import type { Way } from './ways';

/** A figure nobody typed. */
export interface AssumedFigure {
  /** As the levels package calls it. */
  name: string;
  label: string;
  unit: QuantityUnit;
  start: string;
  /** What stands for it while it is empty, where the method knows by itself. */
  empty?: string;
  isExact?: boolean;
}

const perCent = (relative: number): string => String(Number((100 * relative).toPrecision(3)));

const { verticalGainToleranceRel, probeToleranceRel, loadToleranceRel } = ASSUMED_SCOPE_LIMITS;

const LOAD = {
  name: 'loadToleranceRel',
  label: 'Load',
  unit: '%',
  start: perCent(loadToleranceRel),
} as const;
const SCOPE: AssumedFigure[] = [
  {
    ...{ name: 'verticalGainToleranceRel', label: 'Vertical gain', unit: '%' },
    start: perCent(verticalGainToleranceRel),
  },
  {
    ...{ name: 'probeToleranceRel', label: 'Probe', unit: '%', start: '' },
    empty: `± ${perCent(probeToleranceRel[10])} % at ×10, ${perCent(probeToleranceRel[1])} % at ×1`,
  },
  LOAD,
];

const decibels = (name: keyof typeof ASSUMED, label: string): AssumedFigure => {
  return { name, label, unit: 'dB', start: String(ASSUMED[name]) };
};

const AMPLITUDE = decibels('amplitudeAccuracyDb', 'Amplitude accuracy');
const FIDELITY = decibels('scaleFidelityDb', 'Scale fidelity');
const CONFORMITY = decibels('conformityDb', 'Fit of line or table');
const PADS: AssumedFigure = {
  ...{ name: 'padToleranceDb', label: 'Pads', unit: 'dB', start: '' },
  empty: `± ${ASSUMED_PAD_TOLERANCE_DB} dB when in line`,
};
const VOLTMETER: AssumedFigure = {
  ...{ name: 'meterAccuracyRel', label: 'Voltmeter', unit: '%' },
  start: perCent(ASSUMED_METER_ACCURACY_REL),
};

const TIME_BASE: AssumedFigure = {
  ...{ name: 'timeBaseToleranceRel', label: 'Time base', unit: '%' },
  start: perCent(ASSUMED_TIME_BASE_REL),
};

/** What each way takes for granted; nothing where everything is typed. */
export const ASSUMED_FIGURES: Record<Way, readonly AssumedFigure[]> = {
  oscilloscope: SCOPE,
  'dummy-load': SCOPE,
  'two-tone-envelope': SCOPE,
  analyzer: [AMPLITUDE, PADS],
  'dummy-load-tap': [AMPLITUDE, PADS, decibels('tapToleranceDb', 'Tap')],
  harmonic: [FIDELITY, decibels('flatnessDb', 'Flatness')],
  intermodulation: [FIDELITY],
  meter: [{ name: 'accuracyRel', label: 'Accuracy', unit: '%', start: perCent(ASSUMED.accuracyRel) }],
  counter: [
    { name: 'timeBasePpm', label: 'Time base', unit: 'ppm', start: String(ASSUMED.timeBasePpm) },
    { name: 'prescaler', label: 'Prescaler', unit: '', start: '1', isExact: true },
  ],
  'log-detector': [CONFORMITY, VOLTMETER, PADS],
  'detector-table': [CONFORMITY, VOLTMETER, PADS],
  'diode-probe': [
    {
      ...{ name: 'diodeDropPlusMinusVolts', label: 'Drop of the diode', unit: 'V' },
      start: String(ASSUMED.diodeDropPlusMinusVolts),
    },
    VOLTMETER,
    LOAD,
    { name: 'peakPerVolt', label: 'Peak for each volt shown', unit: '', start: '1', isExact: true },
  ],
  'time-base': [TIME_BASE],
  'rise-time': [
    TIME_BASE,
    {
      ...{ name: 'riseToleranceRel', label: 'Its own rise', unit: '%' },
      start: perCent(ASSUMED_RISE_REL),
    },
  ],
  gain: [],
  'probe-loading': [],
};

/** '± 3 %', as listed; what cannot be read is shown as it was typed. */
export function figureText({ unit, empty = '', isExact }: AssumedFigure, text: string): string {
  if (text.trim() === '') return empty;
  const typed = typedQuantity(text, unit);
  const figure = typed.state === 'read' ? formatQuantity(typed.value, unit) : text;
  return isExact ? figure : `± ${figure}`;
}
