/** A stretch of time, half-open: its end is the next one's start. */
export interface Span {
  startsAt: Date;
  endsAt: Date;
}

/** What stands in the way of one wanted span on one bench or instrument. */
export interface Clash extends Span {
  /** Which of the wanted spans, from 0. */
  spanIndex: number;
  bookingId: string;
  kind: 'session' | 'build night';
  /** The night's title; empty for a session. */
  title: string;
  personId: string;
  personName: string;
  resourceId: string;
  resourceTag: string;
  madeAt: Date;
}

export interface NightReservation extends Span {
  /** The mentor who plans it. */
  personId: string;
  title: string;
  /** 1 or more benches and instruments. */
  resourceIds: readonly string[];
}
