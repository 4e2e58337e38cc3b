import { requireOneOf, requireWithin } from '../domain';
import { COPPER_OHM_METRES } from '../matching/windings';

/** Classes of a linear power stage with a bound to their efficiency. */
export type AmplifierClass = 'A' | 'A, resistor fed' | 'AB' | 'B';

/** The most a class can make of its direct current at full output: 1/2, half of it past a resistor, π/4 for AB and B; textbook. */
const GREATEST_EFFICIENCY: Record<AmplifierClass, number> = {
  A: 0.5,
  'A, resistor fed': 0.25,
  AB: Math.PI / 4,
  B: Math.PI / 4,
};
const CLASSES = ['A', 'A, resistor fed', 'AB', 'B'] as const;

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
  requireOneOf({ input: 'amplifierClass', label: 'Class' }, CLASSES, amplifierClass);
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

/** Heat of an ideal class-B stage over all levels, for a heat sink that must stand the worst of them. */
export interface ClassBHeat {
  /** Greatest heat of all stages together, W: more than at full output. */
  worstWatts: number;
  /** Part of the swing at which it is so hot. */
  worstSwing: number;
  /** Efficiency on average over two equal tones at full peak envelope power. */
  twoToneEfficiency: number;
  /** Heat on average over those. */
  twoToneWatts: number;
}

/**
 * What an ideal class-B stage turns to heat at worst, and while two equal tones test it.
 *
 * A real stage makes more: its idle current and the voltage left across its devices come on top.
 *
 * @param peakWatts - greatest output, or peak envelope power of the two tones.
 * @throws OutOfDomainError naming the input.
 * @example classBHeat(100) //=> { worstWatts: 40.528473, worstSwing: 0.63662, twoToneEfficiency: 0.61685, twoToneWatts: 31.056947 }
 * @see heat is (4/π)·v − v² of the greatest output at a part v of the swing, 4/π² of it at v = 2/π; over the envelope of
 *   two tones v averages 2/π and v² one half, so (π/4)·(1/2)/(2/π) = π²/16; textbook
 */
export function classBHeat(peakWatts: number): ClassBHeat {
  const domain = { input: 'peakWatts', label: 'Peak envelope power', unit: 'W', above: 0, atMost: 1e6 };
  const peak = requireWithin(domain, peakWatts);
  const twoToneEfficiency = Math.PI ** 2 / 16;
  // The average of two equal tones is half of their peak.
  const averageWatts = peak / 2;
  return {
    worstWatts: (4 / Math.PI ** 2) * peak,
    worstSwing: 2 / Math.PI,
    twoToneEfficiency,
    twoToneWatts: averageWatts / twoToneEfficiency - averageWatts,
  };
}

/** A pair of wires between a supply and what it feeds. */
export interface SupplyWire {
  amperes: number;
  /** From the supply to the load; the current goes there and back. */
  lengthMetres: number;
  /** Of copper, each wire, m². */
  areaSquareMetres: number;
}

/**
 * Voltage lost in a pair of copper wires.
 *
 * @returns V at 20 °C; 4 % more for every 10 °C warmer.
 * @throws OutOfDomainError naming the input.
 * @example supplyDropVolts({ amperes: 20, lengthMetres: 2, areaSquareMetres: 4e-6 }) //=> 0.34482
 * @see U = 2·ρ·l·I/A, textbook
 */
export function supplyDropVolts({ amperes, lengthMetres, areaSquareMetres }: SupplyWire): number {
  requireWithin({ input: 'amperes', label: 'Supply current', unit: 'A', atLeast: 0, atMost: 1e4 }, amperes);
  requireWithin({ input: 'lengthMetres', label: 'Length', unit: 'm', above: 0, atMost: 1e4 }, lengthMetres);
  const area = { input: 'areaSquareMetres', label: 'Cross section', unit: 'm²', above: 0, atMost: 1 };
  return (2 * COPPER_OHM_METRES * lengthMetres * amperes) / requireWithin(area, areaSquareMetres);
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
