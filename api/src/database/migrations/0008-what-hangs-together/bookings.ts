const HELD = `cancelled_at IS NULL OR cancelled_at > starts_at`;

/**
 * The exclusion stands on the items, so they repeat the times of their booking and whether it holds. A composite key
 * ties the three to it: whoever moves or cancels a booking moves or gives back what it holds.
 */
export const BOOKINGS_AS_HELD: readonly string[] = [
  `ALTER TABLE "booking" ADD "holds" boolean NOT NULL DEFAULT true`,
  `UPDATE "booking" SET "holds" = (${HELD})`,
  `ALTER TABLE "booking" ADD CONSTRAINT "booking_holds_unless_cancelled" CHECK (holds = (${HELD}))`,
  `ALTER TABLE "booking" ADD CONSTRAINT "booking_as_held" UNIQUE ("id", "starts_at", "ends_at", "holds")`,
  `ALTER TABLE "booking_item" DROP CONSTRAINT "booking_no_overlap"`,
  `ALTER TABLE "booking_item" DROP CONSTRAINT "booking_item_of_booking"`,
  `ALTER TABLE "booking_item" ADD "holds" boolean NOT NULL DEFAULT true`,
  `UPDATE "booking_item" SET ("starts_at", "ends_at", "holds") =
     (SELECT "starts_at", "ends_at", "holds" FROM "booking" WHERE "booking"."id" = "booking_item"."booking_id")`,
  `ALTER TABLE "booking_item" DROP COLUMN "cancelled_at"`,
  `ALTER TABLE "booking_item" ADD CONSTRAINT "booking_no_overlap" EXCLUDE USING gist ("resource_id" WITH =, tstzrange("starts_at", "ends_at", '[)') WITH &&) WHERE ("holds")`,
  `ALTER TABLE "booking_item" ADD CONSTRAINT "booking_item_as_booked" FOREIGN KEY ("booking_id", "starts_at", "ends_at", "holds") REFERENCES "booking"("id", "starts_at", "ends_at", "holds") ON DELETE CASCADE ON UPDATE CASCADE`,

  // A booking of nothing holds nothing; looked at when the transaction ends, with the booking locked so that two who
  // take one thing each out of it do not both see the other's.
  `CREATE FUNCTION booking_holds_something() RETURNS trigger LANGUAGE plpgsql AS $$
   DECLARE
     looked_at uuid := CASE TG_OP WHEN 'INSERT' THEN to_jsonb(NEW) ->> 'id' ELSE to_jsonb(OLD) ->> 'booking_id' END;
   BEGIN
     PERFORM FROM booking WHERE id = looked_at FOR NO KEY UPDATE;
     IF FOUND AND NOT EXISTS (SELECT FROM booking_item WHERE booking_id = looked_at) THEN
       PERFORM broken('booking_holds_something', 'A booking holds at least one bench or instrument.');
     END IF;
     RETURN NULL;
   END $$`,
  `CREATE CONSTRAINT TRIGGER booking_holds_something AFTER INSERT ON booking
   DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION booking_holds_something()`,
  `CREATE CONSTRAINT TRIGGER booking_holds_something AFTER DELETE OR UPDATE OF booking_id ON booking_item
   DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION booking_holds_something()`,
];

export const BOOKINGS_LOOSE: readonly string[] = [
  `DROP TRIGGER booking_holds_something ON booking_item`,
  `DROP TRIGGER booking_holds_something ON booking`,
  `DROP FUNCTION booking_holds_something()`,
  `ALTER TABLE "booking_item" DROP CONSTRAINT "booking_item_as_booked"`,
  `ALTER TABLE "booking_item" DROP CONSTRAINT "booking_no_overlap"`,
  `ALTER TABLE "booking_item" ADD "cancelled_at" TIMESTAMP WITH TIME ZONE`,
  `UPDATE "booking_item" SET "cancelled_at" =
     (SELECT "cancelled_at" FROM "booking" WHERE "booking"."id" = "booking_item"."booking_id") WHERE NOT "holds"`,
  `ALTER TABLE "booking_item" DROP COLUMN "holds"`,
  `ALTER TABLE "booking_item" ADD CONSTRAINT "booking_item_of_booking" FOREIGN KEY ("booking_id") REFERENCES "booking"("id") ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE "booking_item" ADD CONSTRAINT "booking_no_overlap" EXCLUDE USING gist ("resource_id" WITH =, tstzrange("starts_at", "ends_at", '[)') WITH &&) WHERE ("cancelled_at" IS NULL)`,
  `ALTER TABLE "booking" DROP CONSTRAINT "booking_as_held"`,
  `ALTER TABLE "booking" DROP CONSTRAINT "booking_holds_unless_cancelled"`,
  `ALTER TABLE "booking" DROP COLUMN "holds"`,
];
