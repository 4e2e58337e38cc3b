import type { Span } from '../bookings/bookings.service';
import { instantOf, wallOf, type WallTime } from '../common/wall-clock';

/**
 * A night at the hours of another: 19:30 to 22:00 is 19:30 to 22:00 on the wall whatever the clocks do meanwhile, so
 * that one across a change is an hour longer or shorter by the watch.
 *
 * | the wall | answer |
 * |---|---|
 * | start skipped in spring | begins an hour later on the wall, and lasts as long as the other |
 * | end skipped or twice | as `instantOf` reads it |
 * | the other one's own hours run backwards, because the clocks went back during it | lasts as long as that one |
 */
export function spanOnWall(start: WallTime, like: Span, zone: string): Span {
  const startsAt = instantOf(start, zone);
  const onTheWall = wallOf(like.startsAt, zone).until(wallOf(like.endsAt, zone));
  const isSkipped = !wallOf(startsAt, zone).equals(start);
  if (onTheWall.sign <= 0 || isSkipped) {
    const length = like.endsAt.getTime() - like.startsAt.getTime();
    return { startsAt, endsAt: new Date(startsAt.getTime() + length) };
  }
  return { startsAt, endsAt: instantOf(start.add(onTheWall), zone) };
}
