import type { QuantityUnit } from '@ferrite-row/levels';

interface TypedParts {
  number: string;
  unit: QuantityUnit;
}

/** Splits '20 mV/div' into number and unit, for a field whose unit is a select. */
export function splitTyped(text: string, units: readonly QuantityUnit[], own: QuantityUnit): TypedParts {
  const unit = units.find((candidate) => text.endsWith(` ${candidate}`));
  return unit ? { number: text.slice(0, -unit.length - 1), unit } : { number: text, unit: own };
}

/** The text a field keeps for a number and a chosen unit; the field's own unit needs no letters. */
export function joinUnit(number: string, unit: QuantityUnit, own: QuantityUnit): string {
  return unit === own ? number : `${number} ${unit}`;
}
