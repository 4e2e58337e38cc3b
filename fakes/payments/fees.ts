export interface FeeRule {
  /** Hundredths of a per cent: 150 is 1.5 %. */
  basisPoints: number;
  fixedMinor: number;
}

/** Fee on one card payment in minor units: the share rounded half up, in integers only, plus the fixed part. */
export function feeMinor(amountMinor: number, rule: FeeRule): number {
  const tenThousandths = amountMinor * rule.basisPoints + 5000;
  return (tenThousandths - (tenThousandths % 10_000)) / 10_000 + rule.fixedMinor;
}
