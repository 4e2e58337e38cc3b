import { Injectable } from '@nestjs/common';

/** The only source of "now" in the API. Nothing else calls `new Date()` without an argument. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }
}

/** A clock that stands where it is put: for tests, and for seeds that lay out a past. */
export class SettableClock extends Clock {
  constructor(private instant: Date) {
    super();
  }

  override now(): Date {
    return new Date(this.instant);
  }

  set(instant: Date): void {
    this.instant = new Date(instant);
  }

  advance(milliseconds: number): void {
    this.instant = new Date(this.instant.getTime() + milliseconds);
  }
}
