import { requireWithin } from '../domain';

/** From the junction to the air; thermal resistances in kelvin per watt. */
export interface HeatPath {
  watts: number;
  ambientCelsius: number;
  junctionToCase: number;
  /** Washer, paste and pressure. */
  caseToSink: number;
  /** What the junction may reach, from the data sheet. */
  greatestJunctionCelsius: number;
}

/** Temperatures along the path. */
export interface HeatChain {
  sinkCelsius: number;
  caseCelsius: number;
  junctionCelsius: number;
  /** Negative: the junction gets too hot. */
  marginKelvin: number;
  /** Dissipation at which the junction would just reach its limit. */
  greatestWatts: number;
}

/** A sink over this burns a hand that stays on it; common practice. */
export const HOT_TO_TOUCH_CELSIUS = 55;

function requirePath(path: HeatPath): HeatPath {
  requireWithin({ input: 'watts', label: 'Dissipation', unit: 'W', atLeast: 0, atMost: 1e6 }, path.watts);
  const celsius = { unit: '°C', atLeast: -100, atMost: 500 };
  requireWithin({ ...celsius, input: 'ambientCelsius', label: 'Air' }, path.ambientCelsius);
  const greatest = { ...celsius, input: 'greatestJunctionCelsius', label: 'Greatest junction temperature' };
  requireWithin({ ...greatest, above: path.ambientCelsius }, path.greatestJunctionCelsius);
  const resistance = { unit: 'K/W', atLeast: 0, atMost: 1e4 };
  requireWithin(
    { ...resistance, input: 'junctionToCase', label: 'Junction to case', above: 0 },
    path.junctionToCase,
  );
  requireWithin({ ...resistance, input: 'caseToSink', label: 'Case to sink' }, path.caseToSink);
  return path;
}

/**
 * Temperatures of a device on a heat sink, in steady state.
 *
 * @param sinkToAir - of the sink as mounted, in still air unless it is blown, K/W.
 * @throws OutOfDomainError naming the input.
 * @example heatChain({ watts: 40, ambientCelsius: 25, junctionToCase: 1, caseToSink: 0.2, greatestJunctionCelsius: 175 }, 0.8).junctionCelsius //=> 105
 * @see thermal resistances in series; data-sheet practice
 */
export function heatChain(path: HeatPath, sinkToAir: number): HeatChain {
  const { watts, ambientCelsius, junctionToCase, caseToSink, greatestJunctionCelsius } = requirePath(path);
  requireWithin(
    { input: 'sinkToAir', label: 'Sink to air', unit: 'K/W', atLeast: 0, atMost: 1e4 },
    sinkToAir,
  );
  const sinkCelsius = ambientCelsius + watts * sinkToAir;
  const caseCelsius = sinkCelsius + watts * caseToSink;
  const junctionCelsius = caseCelsius + watts * junctionToCase;
  const whole = junctionToCase + caseToSink + sinkToAir;
  return {
    sinkCelsius,
    caseCelsius,
    junctionCelsius,
    marginKelvin: greatestJunctionCelsius - junctionCelsius,
    greatestWatts: (greatestJunctionCelsius - ambientCelsius) / whole,
  };
}

/** The sink a dissipation asks for. */
export interface SinkNeeded {
  isPossible: boolean;
  /** K/W at most; absent when no sink is good enough. */
  sinkToAir?: number;
  /** What is left for the sink after the path before it, K; negative when none is. */
  leftKelvin: number;
}

/**
 * The poorest heat sink that will do.
 *
 * @throws OutOfDomainError naming the input; a dissipation of 0 asks for no sink.
 * @example sinkNeeded({ watts: 60, ambientCelsius: 40, junctionToCase: 0.8, caseToSink: 0.15, greatestJunctionCelsius: 150 }).sinkToAir //=> 0.883333
 * @example sinkNeeded({ watts: 60, ambientCelsius: 40, junctionToCase: 1.8, caseToSink: 0.15, greatestJunctionCelsius: 150 }) //=> { isPossible: false, leftKelvin: -7 }
 * @see as `heatChain`, solved for the sink
 */
export function sinkNeeded(path: HeatPath): SinkNeeded {
  const { watts, ambientCelsius, junctionToCase, caseToSink, greatestJunctionCelsius } = requirePath(path);
  requireWithin({ input: 'watts', label: 'Dissipation', unit: 'W', above: 0 }, watts);
  const leftKelvin = greatestJunctionCelsius - ambientCelsius - watts * (junctionToCase + caseToSink);
  return leftKelvin > 0
    ? { isPossible: true, sinkToAir: leftKelvin / watts, leftKelvin }
    : { isPossible: false, leftKelvin };
}

/**
 * Dissipation left at a case temperature, by the straight line of a data sheet from 25 °C.
 *
 * @throws OutOfDomainError naming the input.
 * @example deratedWatts(150, 100, 175) //=> 75
 * @see linear derating from 25 °C; data-sheet practice
 */
export function deratedWatts(
  wattsAt25: number,
  caseCelsius: number,
  greatestJunctionCelsius: number,
): number {
  requireWithin(
    { input: 'wattsAt25', label: 'Dissipation at 25 °C', unit: 'W', above: 0, atMost: 1e6 },
    wattsAt25,
  );
  const greatest = { input: 'greatestJunctionCelsius', label: 'Greatest junction temperature', unit: '°C' };
  requireWithin({ ...greatest, above: 25, atMost: 500 }, greatestJunctionCelsius);
  requireWithin({ input: 'caseCelsius', label: 'Case', unit: '°C', atLeast: -100, atMost: 500 }, caseCelsius);
  const part = (greatestJunctionCelsius - Math.max(caseCelsius, 25)) / (greatestJunctionCelsius - 25);
  return wattsAt25 * Math.max(part, 0);
}
