import type { Sheet } from '../results/sheet';

/** Something marked on the drawn rule. */
export interface RuleMark {
  db: number;
  words: string;
  /** Copper for what is typed, ink for what comes of it. */
  tone: 'copper' | 'ink';
}

/** What every conversion comes to. */
export interface ConversionSheet extends Sheet {
  /** Over the table. */
  heading: string;
  marks: RuleMark[];
  /** Resistance of the rule's volts; absent where the rule is of ratios. */
  ohms?: number;
}
