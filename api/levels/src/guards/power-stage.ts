import { requireOneOf, requireWithin } from '../domain';

/** Classes of a linear power stage with a bound to their efficiency. */
export type AmplifierClass = 'A' | 'AB' | 'B';

/** The most a class can make of its direct current at full output: 1/2, and π/4 for AB and B; textbook. */
const GREATEST_EFFICIENCY: Record<AmplifierClass, number> = { A: 0.5, AB: Math.PI / 4, B: Math.PI / 4 };

/** A power stage under its supply. */
export interface SupplyInput {
  volts: number;
  amperes: number;
  outputWatts: number;
  amplifierClass: AmplifierClass;
}

/** What becomes of the direct current. */
export interface SupplyBalance {
  inputWatts: number;
  efficiency: number;
  /** Left in the stage as heat, its filter and transformers included. */
  heatWatts: number;
  greatestEfficiency: number;
  /** False where more comes out than the class can make: one of the readings is wrong. */
  isPlausible: boolean;
}

/**
 * Power balance of a power stage.
 *
 * @throws OutOfDomainError naming the input; more power out than goes in too.
 * @example supplyBalance({ volts: 13.8, amperes: 20, outputWatts: 100, amplifierClass: 'AB' }).heatWatts //=> 176
 * @see conservation of energy; bounds of the classes: textbook
 */
export function supplyBalance({ volts, amperes, outputWatts, amplifierClass }: SupplyInput): SupplyBalance {
  requireWithin({ input: 'volts', label: 'Supply voltage', unit: 'V', above: 0, atMost: 1e5 }, volts);
  requireWithin({ input: 'amperes', label: 'Supply current', unit: 'A', above: 0, atMost: 1e4 }, amperes);
  const inputWatts = volts * amperes;
  const output = { input: 'outputWatts', label: 'Power out', unit: 'W', atLeast: 0, below: inputWatts };
  requireWithin(output, outputWatts);
  requireOneOf({ input: 'amplifierClass', label: 'Class' }, ['A', 'AB', 'B'], amplifierClass);
  const greatestEfficiency = GREATEST_EFFICIENCY[amplifierClass];
  const efficiency = outputWatts / inputWatts;
  const isPlausible = efficiency <= greatestEfficiency;
  return { inputWatts, efficiency, heatWatts: inputWatts - outputWatts, greatestEfficiency, isPlausible };
}

/**
 * Efficiency of an ideal class-B stage that is not driven to its full output.
 *
 * @param swing - output voltage over the greatest, 0 to 1.
 * @throws OutOfDomainError outside that.
 * @example classBEfficiency(0.5) //=> 0.392699
 * @see (π/4)·V/Vmax; textbook
 */
export function classBEfficiency(swing: number): number {
  return (
    (Math.PI / 4) *
    requireWithin({ input: 'swing', label: 'Part of the swing', atLeast: 0, atMost: 1 }, swing)
  );
}

/**
 * Load resistance at a collector or drain for a power, one device, sine.
 *
 * Push-pull between two collectors it is four times one side's share: `2·(V − Vsat)²/P`.
 *
 * @param saturationVolts - below the supply voltage.
 * @returns ohms.
 * @throws OutOfDomainError naming the input.
 * @example loadForPower(13.8, 1, 20) //=> 4.096
 * @example loadForPower(13.8, 1, 100, true) //=> 3.2768
 * @see (V − Vsat)²/(2·P); textbook
 */
export function loadForPower(
  volts: number,
  saturationVolts: number,
  outputWatts: number,
  isPushPull = false,
): number {
  requireWithin({ input: 'volts', label: 'Supply voltage', unit: 'V', above: 0, atMost: 1e5 }, volts);
  const saturation = { input: 'saturationVolts', label: 'Voltage left across the device', unit: 'V' };
  requireWithin({ ...saturation, atLeast: 0, below: volts }, saturationVolts);
  requireWithin({ input: 'outputWatts', label: 'Power out', unit: 'W', above: 0, atMost: 1e6 }, outputWatts);
  return ((volts - saturationVolts) ** 2 / outputWatts) * (isPushPull ? 2 : 0.5);
}
