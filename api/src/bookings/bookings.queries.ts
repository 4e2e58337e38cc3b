/** $1 resource ids, $2 and $3 starts and ends of the wanted spans, $4 bookings that do not count. */
export const FIND_CLASHES = `
  SELECT (wanted.ordinal - 1)::integer AS "spanIndex", booking.id AS "bookingId", booking.kind, booking.title,
         person.id AS "personId", person.name AS "personName",
         resource.id AS "resourceId", resource.tag AS "resourceTag",
         item.starts_at AS "startsAt", item.ends_at AS "endsAt", booking.made_at AS "madeAt"
  FROM unnest($2::timestamptz[], $3::timestamptz[]) WITH ORDINALITY AS wanted(starts_at, ends_at, ordinal)
  JOIN booking_item item
    ON item.resource_id = ANY ($1::uuid[]) AND item.holds
   AND tstzrange(item.starts_at, item.ends_at, '[)') && tstzrange(wanted.starts_at, wanted.ends_at, '[)')
  JOIN booking ON booking.id = item.booking_id
  JOIN person ON person.id = booking.person_id
  JOIN resource ON resource.id = item.resource_id
  WHERE booking.id <> ALL ($4::uuid[])
  ORDER BY wanted.ordinal, item.starts_at, resource.position, resource.tag`;

/**
 * $1 resource ids, $2 wanted start, $3 wanted length in seconds, $4 and $5 starts and ends of the
 * stretches to look in, $6 the club's zone.
 *
 * Free is those stretches less everything any of them is booked for. Each gap that is long enough offers the place in it
 * that lies nearest to the wanted time; and the same wall time of the days around, where that is free, because a
 * member who is free at 19:30 today is likelier free at 19:30 tomorrow than at midnight.
 */
export const FIND_NEAREST_FREE = `
  WITH wish AS (
    SELECT $2::timestamptz AS starts_at, make_interval(secs => $3) AS length,
           (SELECT range_agg(tstzrange(within.starts_at, within.ends_at, '[)'))
            FROM unnest($4::timestamptz[], $5::timestamptz[]) AS within(starts_at, ends_at)) AS search
  ), gap AS (
    SELECT unnest(wish.search - coalesce(
      (SELECT range_agg(tstzrange(item.starts_at, item.ends_at, '[)'))
       FROM booking_item item
       WHERE item.resource_id = ANY ($1::uuid[]) AND item.holds
         AND tstzrange(item.starts_at, item.ends_at, '[)') && wish.search),
      '{}'::tstzmultirange)) AS free
    FROM wish
  ), candidate AS (
    SELECT greatest(lower(gap.free), least(wish.starts_at, upper(gap.free) - wish.length)) AS starts_at
    FROM gap, wish WHERE upper(gap.free) - lower(gap.free) >= wish.length
    UNION
    SELECT other.starts_at
    FROM wish,
      generate_series(-14, 14) AS days,
      LATERAL (SELECT (wish.starts_at AT TIME ZONE $6 + make_interval(days => days)) AT TIME ZONE $6) AS other(starts_at),
      gap
    WHERE tstzrange(other.starts_at, other.starts_at + wish.length, '[)') <@ gap.free
  )
  SELECT candidate.starts_at AS "startsAt", candidate.starts_at + wish.length AS "endsAt"
  FROM candidate, wish
  ORDER BY abs(extract(epoch FROM candidate.starts_at - wish.starts_at)), candidate.starts_at
  LIMIT 3`;
