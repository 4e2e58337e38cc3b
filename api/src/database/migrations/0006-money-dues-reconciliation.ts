import type { MigrationInterface, QueryRunner } from 'typeorm';
import { ACCOUNTS_OF_THE_BOOKS, DROP_RULES, RULES } from './0006-money-rules';

const SEQUENCES = [
  'invoice_number_dues',
  'invoice_number_course_fee',
  'invoice_number_kit',
  'receipt_number',
];

const TABLES: readonly string[] = [
  `CREATE TABLE "entry" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "occurred_on" date NOT NULL, "description" text NOT NULL, "source_kind" text NOT NULL, "source_id" uuid, "reverses_id" uuid, "posting_count" smallint NOT NULL, "made_by_id" uuid, "recorded_at" TIMESTAMP WITH TIME ZONE NOT NULL, CONSTRAINT "entry_reversed_once" UNIQUE ("reverses_id"), CONSTRAINT "entry_description_present" CHECK (length(btrim(description)) > 0), CONSTRAINT "entry_posting_count" CHECK (posting_count >= 2), CONSTRAINT "entry_pk" PRIMARY KEY ("id"))`,
  `CREATE INDEX "entry_by_source" ON "entry"  ("source_kind", "source_id") `,
  `CREATE INDEX "entry_by_day" ON "entry"  ("occurred_on") `,
  `CREATE TABLE "invoice" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "number" text NOT NULL, "kind" text NOT NULL, "person_id" uuid NOT NULL, "description" text NOT NULL, "amount_minor" bigint NOT NULL, "issued_on" date NOT NULL, "due_on" date NOT NULL, "reference" text NOT NULL, "entry_id" uuid NOT NULL, "raised_at" TIMESTAMP WITH TIME ZONE NOT NULL, CONSTRAINT "invoice_has_its_entry" UNIQUE ("entry_id"), CONSTRAINT "invoice_reference_once" UNIQUE ("reference"), CONSTRAINT "invoice_number_once" UNIQUE ("number"), CONSTRAINT "invoice_reference_form" CHECK (reference ~ '^RF[0-9]{2}[A-Z0-9]{1,21}$'), CONSTRAINT "invoice_kind_known" CHECK (kind IN ('dues', 'course fee', 'kit')), CONSTRAINT "invoice_due_after_issue" CHECK (due_on >= issued_on), CONSTRAINT "invoice_amount_positive" CHECK (amount_minor > 0 AND amount_minor <= 9007199254740991), CONSTRAINT "invoice_pk" PRIMARY KEY ("id"))`,
  `CREATE INDEX "invoice_by_due_day" ON "invoice"  ("due_on") `,
  `CREATE INDEX "invoice_of_person" ON "invoice"  ("person_id") `,
  `CREATE TABLE "checkout" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "invoice_id" uuid NOT NULL, "amount_minor" bigint NOT NULL, "currency" text NOT NULL, "session_id" text, "url" text, "state" text NOT NULL DEFAULT 'open', "opened_at" TIMESTAMP WITH TIME ZONE NOT NULL, "changed_at" TIMESTAMP WITH TIME ZONE NOT NULL, CONSTRAINT "checkout_session_once" UNIQUE ("session_id"), CONSTRAINT "checkout_state_known" CHECK (state IN ('open', 'confirming', 'paid', 'failed', 'expired')), CONSTRAINT "checkout_amount_positive" CHECK (amount_minor > 0), CONSTRAINT "checkout_pk" PRIMARY KEY ("id"))`,
  `CREATE UNIQUE INDEX "checkout_one_live" ON "checkout"  ("invoice_id") WHERE state IN ('open', 'confirming')`,
  `CREATE TABLE "payment" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "receipt_number" text NOT NULL, "person_id" uuid NOT NULL, "method" text NOT NULL, "amount_minor" bigint NOT NULL, "received_on" date NOT NULL, "note" text NOT NULL DEFAULT '', "taken_by_id" uuid, "client_key" uuid, "card_session_id" text, "banked_on" date, "entry_id" uuid NOT NULL, "recorded_at" TIMESTAMP WITH TIME ZONE NOT NULL, "taken_back_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "payment_has_its_entry" UNIQUE ("entry_id"), CONSTRAINT "payment_card_session_once" UNIQUE ("card_session_id"), CONSTRAINT "payment_client_key_once" UNIQUE ("client_key"), CONSTRAINT "payment_receipt_number_once" UNIQUE ("receipt_number"), CONSTRAINT "payment_at_bank_by_transfer_or_cheque" CHECK (banked_on IS NULL OR method IN ('transfer', 'cheque')), CONSTRAINT "payment_card_has_session" CHECK ((method = 'card') = (card_session_id IS NOT NULL)), CONSTRAINT "payment_method_known" CHECK (method IN ('card', 'cash', 'cheque', 'transfer')), CONSTRAINT "payment_amount_positive" CHECK (amount_minor > 0 AND amount_minor <= 9007199254740991), CONSTRAINT "payment_pk" PRIMARY KEY ("id"))`,
  `CREATE INDEX "payment_by_day" ON "payment"  ("received_on") `,
  `CREATE INDEX "payment_of_person" ON "payment"  ("person_id") `,
  `CREATE TABLE "payment_allocation" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "payment_id" uuid NOT NULL, "invoice_id" uuid NOT NULL, "amount_minor" bigint NOT NULL, "allocated_at" TIMESTAMP WITH TIME ZONE NOT NULL, "credit_entry_id" uuid, "released_at" TIMESTAMP WITH TIME ZONE, CONSTRAINT "payment_allocation_positive" CHECK (amount_minor > 0), CONSTRAINT "payment_allocation_pk" PRIMARY KEY ("id"))`,
  `CREATE INDEX "payment_allocation_of_invoice" ON "payment_allocation"  ("invoice_id") `,
  `CREATE UNIQUE INDEX "payment_allocation_once" ON "payment_allocation"  ("payment_id", "invoice_id") WHERE released_at IS NULL`,
  `CREATE TABLE "payment_event" ("id" text NOT NULL, "type" text NOT NULL, "received_at" TIMESTAMP WITH TIME ZONE NOT NULL, "outcome" text NOT NULL DEFAULT 'noted', "note" text NOT NULL DEFAULT '', CONSTRAINT "payment_event_outcome_known" CHECK (outcome IN ('acted', 'noted', 'needs a look')), CONSTRAINT "payment_event_pk" PRIMARY KEY ("id"))`,
  `CREATE INDEX "payment_event_needs_a_look" ON "payment_event"  ("received_at") WHERE outcome = 'needs a look'`,
  `CREATE TABLE "tier" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "name" text NOT NULL, "amount_minor" bigint NOT NULL, "months" smallint NOT NULL, CONSTRAINT "tier_name_once" UNIQUE ("name"), CONSTRAINT "tier_months_sensible" CHECK (months BETWEEN 1 AND 12), CONSTRAINT "tier_amount_positive" CHECK (amount_minor > 0), CONSTRAINT "tier_pk" PRIMARY KEY ("id"))`,
  `CREATE TABLE "person_tier" ("person_id" uuid NOT NULL, "from_on" date NOT NULL, "tier_id" uuid NOT NULL, CONSTRAINT "person_tier_pk" PRIMARY KEY ("person_id", "from_on"))`,
  `CREATE TABLE "account" ("code" text NOT NULL, "name" text NOT NULL, "kind" text NOT NULL, "settles_lines" boolean NOT NULL DEFAULT false, CONSTRAINT "account_name_once" UNIQUE ("name"), CONSTRAINT "account_kind_known" CHECK (kind IN ('asset', 'liability', 'income', 'expense', 'equity')), CONSTRAINT "account_pk" PRIMARY KEY ("code"))`,
  `CREATE TABLE "posting" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "entry_id" uuid NOT NULL, "account_code" text NOT NULL, "amount_minor" bigint NOT NULL, CONSTRAINT "posting_amount_exact" CHECK (abs(amount_minor) <= 9007199254740991), CONSTRAINT "posting_amount_not_zero" CHECK (amount_minor <> 0), CONSTRAINT "posting_pk" PRIMARY KEY ("id"))`,
  `CREATE INDEX "posting_of_account" ON "posting"  ("account_code") `,
  `CREATE INDEX "posting_of_entry" ON "posting"  ("entry_id") `,
  `CREATE TABLE "bank_statement" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "position" integer NOT NULL, "file_name" text NOT NULL, "from_on" date NOT NULL, "to_on" date NOT NULL, "opening_minor" bigint NOT NULL, "closing_minor" bigint NOT NULL, "known_lines" integer NOT NULL, "imported_at" TIMESTAMP WITH TIME ZONE NOT NULL, "imported_by_id" uuid NOT NULL, CONSTRAINT "bank_statement_position_once" UNIQUE ("position"), CONSTRAINT "bank_statement_days_in_order" CHECK (from_on <= to_on), CONSTRAINT "bank_statement_pk" PRIMARY KEY ("id"))`,
  `CREATE TABLE "statement_line" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "statement_id" uuid NOT NULL, "position" integer NOT NULL, "day" date NOT NULL, "description" text NOT NULL, "amount_minor" bigint NOT NULL, "balance_minor" bigint NOT NULL, "fingerprint" text NOT NULL, "occurrence" integer NOT NULL, CONSTRAINT "statement_line_counted_once" UNIQUE ("fingerprint", "occurrence"), CONSTRAINT "statement_line_position_once" UNIQUE ("statement_id", "position"), CONSTRAINT "statement_line_amount_not_zero" CHECK (amount_minor <> 0), CONSTRAINT "statement_line_pk" PRIMARY KEY ("id"))`,
  `CREATE TABLE "line_match" ("id" uuid NOT NULL DEFAULT gen_random_uuid(), "line_id" uuid NOT NULL, "payment_id" uuid, "made_payment" boolean NOT NULL, "entry_id" uuid NOT NULL, "account_code" text, "note" text NOT NULL DEFAULT '', "how" text NOT NULL, "reasons" text array NOT NULL DEFAULT '{}', "matched_at" TIMESTAMP WITH TIME ZONE NOT NULL, "matched_by_id" uuid NOT NULL, "taken_back_at" TIMESTAMP WITH TIME ZONE, "taken_back_by_id" uuid, CONSTRAINT "line_match_has_its_entry" UNIQUE ("entry_id"), CONSTRAINT "line_match_made_payment_is_there" CHECK (NOT made_payment OR payment_id IS NOT NULL), CONSTRAINT "line_match_how_known" CHECK (how IN ('by itself', 'by hand')), CONSTRAINT "line_match_pk" PRIMARY KEY ("id"))`,
  `CREATE UNIQUE INDEX "line_match_payment_once" ON "line_match"  ("payment_id") WHERE taken_back_at IS NULL AND payment_id IS NOT NULL`,
  `CREATE UNIQUE INDEX "line_match_line_once" ON "line_match"  ("line_id") WHERE taken_back_at IS NULL`,
  `ALTER TABLE "entry" ADD CONSTRAINT "entry_reverses_entry" FOREIGN KEY ("reverses_id") REFERENCES "entry"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "entry" ADD CONSTRAINT "entry_made_by_person" FOREIGN KEY ("made_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "invoice" ADD CONSTRAINT "invoice_to_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "invoice" ADD CONSTRAINT "invoice_entry_exists" FOREIGN KEY ("entry_id") REFERENCES "entry"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "checkout" ADD CONSTRAINT "checkout_of_invoice" FOREIGN KEY ("invoice_id") REFERENCES "invoice"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "payment" ADD CONSTRAINT "payment_from_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "payment" ADD CONSTRAINT "payment_taken_by_person" FOREIGN KEY ("taken_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "payment" ADD CONSTRAINT "payment_entry_exists" FOREIGN KEY ("entry_id") REFERENCES "entry"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "payment_allocation" ADD CONSTRAINT "payment_allocation_from_payment" FOREIGN KEY ("payment_id") REFERENCES "payment"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "payment_allocation" ADD CONSTRAINT "payment_allocation_to_invoice" FOREIGN KEY ("invoice_id") REFERENCES "invoice"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "payment_allocation" ADD CONSTRAINT "payment_allocation_entry_exists" FOREIGN KEY ("credit_entry_id") REFERENCES "entry"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "person_tier" ADD CONSTRAINT "person_tier_is_person" FOREIGN KEY ("person_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "person_tier" ADD CONSTRAINT "person_tier_exists" FOREIGN KEY ("tier_id") REFERENCES "tier"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "posting" ADD CONSTRAINT "posting_of_entry_exists" FOREIGN KEY ("entry_id") REFERENCES "entry"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "posting" ADD CONSTRAINT "posting_account_exists" FOREIGN KEY ("account_code") REFERENCES "account"("code") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "bank_statement" ADD CONSTRAINT "bank_statement_imported_by_person" FOREIGN KEY ("imported_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "statement_line" ADD CONSTRAINT "statement_line_of_statement" FOREIGN KEY ("statement_id") REFERENCES "bank_statement"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "line_match" ADD CONSTRAINT "line_match_of_line" FOREIGN KEY ("line_id") REFERENCES "statement_line"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "line_match" ADD CONSTRAINT "line_match_to_payment" FOREIGN KEY ("payment_id") REFERENCES "payment"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "line_match" ADD CONSTRAINT "line_match_entry_exists" FOREIGN KEY ("entry_id") REFERENCES "entry"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "line_match" ADD CONSTRAINT "line_match_account_exists" FOREIGN KEY ("account_code") REFERENCES "account"("code") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "line_match" ADD CONSTRAINT "line_match_by_person" FOREIGN KEY ("matched_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
  `ALTER TABLE "line_match" ADD CONSTRAINT "line_match_taken_back_by_person" FOREIGN KEY ("taken_back_by_id") REFERENCES "person"("id") ON DELETE NO ACTION ON UPDATE NO ACTION`,
];

export class MoneyDuesReconciliation1700000000006 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    for (const table of TABLES) await queryRunner.query(table);
    for (const sequence of SEQUENCES) await queryRunner.query(`CREATE SEQUENCE "${sequence}"`);
    for (const rule of RULES) await queryRunner.query(rule);
    await queryRunner.query(ACCOUNTS_OF_THE_BOOKS);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const rule of DROP_RULES) await queryRunner.query(rule);
    for (const sequence of SEQUENCES) await queryRunner.query(`DROP SEQUENCE "${sequence}"`);
    await queryRunner.query(`ALTER TABLE "line_match" DROP CONSTRAINT "line_match_taken_back_by_person"`);
    await queryRunner.query(`ALTER TABLE "line_match" DROP CONSTRAINT "line_match_by_person"`);
    await queryRunner.query(`ALTER TABLE "line_match" DROP CONSTRAINT "line_match_account_exists"`);
    await queryRunner.query(`ALTER TABLE "line_match" DROP CONSTRAINT "line_match_entry_exists"`);
    await queryRunner.query(`ALTER TABLE "line_match" DROP CONSTRAINT "line_match_to_payment"`);
    await queryRunner.query(`ALTER TABLE "line_match" DROP CONSTRAINT "line_match_of_line"`);
    await queryRunner.query(`ALTER TABLE "statement_line" DROP CONSTRAINT "statement_line_of_statement"`);
    await queryRunner.query(
      `ALTER TABLE "bank_statement" DROP CONSTRAINT "bank_statement_imported_by_person"`,
    );
    await queryRunner.query(`ALTER TABLE "posting" DROP CONSTRAINT "posting_account_exists"`);
    await queryRunner.query(`ALTER TABLE "posting" DROP CONSTRAINT "posting_of_entry_exists"`);
    await queryRunner.query(`ALTER TABLE "person_tier" DROP CONSTRAINT "person_tier_exists"`);
    await queryRunner.query(`ALTER TABLE "person_tier" DROP CONSTRAINT "person_tier_is_person"`);
    await queryRunner.query(
      `ALTER TABLE "payment_allocation" DROP CONSTRAINT "payment_allocation_entry_exists"`,
    );
    await queryRunner.query(
      `ALTER TABLE "payment_allocation" DROP CONSTRAINT "payment_allocation_to_invoice"`,
    );
    await queryRunner.query(
      `ALTER TABLE "payment_allocation" DROP CONSTRAINT "payment_allocation_from_payment"`,
    );
    await queryRunner.query(`ALTER TABLE "payment" DROP CONSTRAINT "payment_entry_exists"`);
    await queryRunner.query(`ALTER TABLE "payment" DROP CONSTRAINT "payment_taken_by_person"`);
    await queryRunner.query(`ALTER TABLE "payment" DROP CONSTRAINT "payment_from_person"`);
    await queryRunner.query(`ALTER TABLE "checkout" DROP CONSTRAINT "checkout_of_invoice"`);
    await queryRunner.query(`ALTER TABLE "invoice" DROP CONSTRAINT "invoice_entry_exists"`);
    await queryRunner.query(`ALTER TABLE "invoice" DROP CONSTRAINT "invoice_to_person"`);
    await queryRunner.query(`ALTER TABLE "entry" DROP CONSTRAINT "entry_made_by_person"`);
    await queryRunner.query(`ALTER TABLE "entry" DROP CONSTRAINT "entry_reverses_entry"`);
    await queryRunner.query(`DROP INDEX "public"."line_match_line_once"`);
    await queryRunner.query(`DROP INDEX "public"."line_match_payment_once"`);
    await queryRunner.query(`DROP TABLE "line_match"`);
    await queryRunner.query(`DROP TABLE "statement_line"`);
    await queryRunner.query(`DROP TABLE "bank_statement"`);
    await queryRunner.query(`DROP INDEX "public"."posting_of_entry"`);
    await queryRunner.query(`DROP INDEX "public"."posting_of_account"`);
    await queryRunner.query(`DROP TABLE "posting"`);
    await queryRunner.query(`DROP TABLE "account"`);
    await queryRunner.query(`DROP TABLE "person_tier"`);
    await queryRunner.query(`DROP TABLE "tier"`);
    await queryRunner.query(`DROP INDEX "public"."payment_event_needs_a_look"`);
    await queryRunner.query(`DROP TABLE "payment_event"`);
    await queryRunner.query(`DROP INDEX "public"."payment_allocation_once"`);
    await queryRunner.query(`DROP INDEX "public"."payment_allocation_of_invoice"`);
    await queryRunner.query(`DROP TABLE "payment_allocation"`);
    await queryRunner.query(`DROP INDEX "public"."payment_of_person"`);
    await queryRunner.query(`DROP INDEX "public"."payment_by_day"`);
    await queryRunner.query(`DROP TABLE "payment"`);
    await queryRunner.query(`DROP INDEX "public"."checkout_one_live"`);
    await queryRunner.query(`DROP TABLE "checkout"`);
    await queryRunner.query(`DROP INDEX "public"."invoice_of_person"`);
    await queryRunner.query(`DROP INDEX "public"."invoice_by_due_day"`);
    await queryRunner.query(`DROP TABLE "invoice"`);
    await queryRunner.query(`DROP INDEX "public"."entry_by_day"`);
    await queryRunner.query(`DROP INDEX "public"."entry_by_source"`);
    await queryRunner.query(`DROP TABLE "entry"`);
  }
}
