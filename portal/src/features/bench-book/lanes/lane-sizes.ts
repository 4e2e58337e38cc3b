/** Pixels of a half hour: two rows of a quarter. */
export const SLOT_PX = 34;
export const MINUTE_PX = SLOT_PX / 30;
/** Width of the column of times. */
export const CLOCK_PX = 50;
