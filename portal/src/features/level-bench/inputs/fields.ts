import type { QuantityUnit } from '@ferrite-row/levels';
import type { ReactNode } from 'react';

/** Another input's choice on which this one depends; any of the words will do. */
export type ShownWhen = Readonly<Record<string, readonly string[]>>;

/** A typed quantity. What a calculation gets is in the SI unit without prefix; per cent become a fraction. */
export interface QuantityInput {
  kind: 'quantity';
  label: string;
  unit: QuantityUnit;
  /** What stands there before anybody types, as if it had been typed. */
  start: string;
  /** Left empty it is left out of the calculation. */
  isOptional?: boolean;
  /** For a unit that is no unit of measure: "m + n", "turns". */
  unitWords?: string;
  /** Otherwise it is not on the page, keeps what was typed, and counts as it started. */
  when?: ShownWhen;
  hint?: ReactNode;
}

export interface ChoiceInput<T extends string = string> {
  kind: 'choice';
  label: string;
  options: readonly { value: T; label: string }[];
  start: T;
  when?: ShownWhen;
  hint?: ReactNode;
}

/** Text a page reads in its own way: a day, a list of stages. */
export interface WordsInput {
  kind: 'words';
  label: string;
  start: string;
  /** Letters an address may bring. */
  longest: number;
  when?: ShownWhen;
  hint?: ReactNode;
}

export type BenchInput = QuantityInput | ChoiceInput | WordsInput;

/** Inputs of a page by name. Name them as the levels package does, so that its errors land on their field. */
export type BenchInputs = Readonly<Record<string, BenchInput>>;

type ValueOf<I extends BenchInput> =
  I extends ChoiceInput<infer T>
    ? T
    : I extends WordsInput
      ? string
      : I extends { isOptional: true }
        ? number | undefined
        : number;

/** What a calculation is given: numbers in SI units and the chosen words. */
export type BenchValues<F extends BenchInputs> = { [K in keyof F]: ValueOf<F[K]> };

type More = Pick<QuantityInput, 'unitWords' | 'when' | 'hint'>;

export const quantity = (
  label: string,
  unit: QuantityUnit,
  start: string,
  more: More = {},
): QuantityInput => ({ kind: 'quantity', label, unit, start, ...more });

export const optional = (
  label: string,
  unit: QuantityUnit,
  more: More = {},
): QuantityInput & { isOptional: true } => ({
  kind: 'quantity',
  label,
  unit,
  start: '',
  isOptional: true,
  ...more,
});

export const choice = <const T extends string>(
  label: string,
  options: readonly { value: T; label: string }[],
  start: NoInfer<T>,
  more: Pick<ChoiceInput, 'when' | 'hint'> = {},
): ChoiceInput<T> => ({ kind: 'choice', label, options, start, ...more });

export const words = (
  label: string,
  start: string,
  more: Pick<WordsInput, 'longest'> & Pick<WordsInput, 'when' | 'hint'>,
): WordsInput => ({ kind: 'words', label, start, ...more });

/** Whether an input is on the page, given what is chosen. */
export const isShown = (
  inputs: BenchInputs,
  name: string,
  texts: Readonly<Record<string, string>>,
): boolean =>
  Object.entries(inputs[name]?.when ?? {}).every(([other, words]) =>
    words.includes(texts[other] ?? inputs[other]?.start ?? ''),
  );
