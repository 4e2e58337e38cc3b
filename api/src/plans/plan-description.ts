import type { EntryMethod } from '@ferrite-row/levels';
import type { CheckKind } from './plan-check.entity';
import type { Caution } from './stage.entity';

/** A plan in plain words and numbers, as a mentor or the demo club writes it down before it is published. */
export interface PlanDescription {
  name: string;
  summary: string;
  edition: number;
  /** In signal order. */
  stages: readonly StageDescription[];
}

export interface StageDescription {
  name: string;
  summary: string;
  cautions?: readonly Caution[];
  /** In signal order. */
  levelPoints?: readonly LevelPointDescription[];
  /** In the order of the checklist. */
  checks: readonly CheckDescription[];
}

export interface LevelPointDescription {
  /** `TP8`, once in a plan. */
  testPoint: string;
  name: string;
  plannedDbm: number;
  toleranceDb: number;
  limitDbm?: number;
}

export interface CheckDescription {
  /** Names the check for others of the same plan that are worked out from it. */
  key: string;
  kind: CheckKind;
  title: string;
  instruction?: string;
  isRequired?: boolean;
  measure?: MeasureDescription;
}

export interface MeasureDescription {
  method: MeasureMethod;
  unit: string;
  window: { low?: number; high?: number };
  target?: number;
  /** What the form starts with, and the accuracies the plan takes for granted. */
  defaults?: Readonly<Record<string, number>>;
  /** For a value that works itself out: keys of the checks it is made of, in the method's order. */
  from?: readonly string[];
  /** The test point this measures. */
  levelPoint?: string;
  /** Name of the kind of instrument it is taken with. */
  instrumentKind?: string;
}

/** Ways in which a value works itself out: a gain is output less input; a carried one was measured at an earlier stage. */
export const DERIVED_METHODS = ['gain', 'carried'] as const;
export type DerivedMethod = (typeof DERIVED_METHODS)[number];

/** How a measure is taken: typed from an instrument, or worked out. */
export type MeasureMethod = EntryMethod | DerivedMethod;

export function isDerived(method: string | null): method is DerivedMethod {
  return DERIVED_METHODS.some((derived) => derived === method);
}
