/** Of the bar of five at a phone's foot, without the safe area below it, px. */
export const BOTTOM_BAR = 62;
