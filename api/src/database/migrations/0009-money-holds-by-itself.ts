import type { MigrationInterface, QueryRunner } from 'typeorm';

const refused = (message: string, values: string, rule: string): string =>
  `RAISE EXCEPTION '${message}', ${values} USING ERRCODE = 'check_violation', CONSTRAINT = '${rule}';`;

/** What was billed and what was received stays as it was written; what is wrong is taken back and written anew. */
const MONEY_STAYS = `
CREATE FUNCTION money_stays() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% on % is refused: what was written down stays, and is taken back', TG_OP, TG_TABLE_NAME
    USING ERRCODE = 'check_violation', CONSTRAINT = TG_NAME;
END $$`;

/** The columns that never change, by table. */
const STAYING: Record<string, readonly string[]> = {
  invoice: ['number', 'kind', 'person_id', 'amount_minor', 'issued_on', 'reference', 'entry_id'],
  payment: [
    'receipt_number',
    'person_id',
    'method',
    'amount_minor',
    'received_on',
    'card_session_id',
    'entry_id',
  ],
  payment_allocation: ['payment_id', 'invoice_id', 'amount_minor', 'credit_entry_id'],
  line_match: ['line_id', 'payment_id', 'made_payment', 'entry_id', 'account_code'],
};

/** Set once: nothing that was taken back comes to life again. */
const ENDS: Record<string, string> = {
  payment: 'taken_back_at',
  payment_allocation: 'released_at',
  line_match: 'taken_back_at',
};

const of = (row: 'OLD' | 'NEW', columns: readonly string[]): string =>
  `(${columns.map((column) => `${row}.${column}`).join(', ')})`;

const staying = ([table, columns]: [string, readonly string[]]): string[] => [
  `CREATE TRIGGER ${table}_stays_as_written BEFORE UPDATE ON ${table} FOR EACH ROW
    WHEN (${of('OLD', columns)} IS DISTINCT FROM ${of('NEW', columns)}) EXECUTE FUNCTION money_stays()`,
  `CREATE TRIGGER ${table}_is_not_deleted BEFORE DELETE ON ${table} FOR EACH ROW EXECUTE FUNCTION money_stays()`,
];

const ending = ([table, column]: [string, string]): string =>
  `CREATE TRIGGER ${table}_ends_for_good BEFORE UPDATE ON ${table} FOR EACH ROW
    WHEN (OLD.${column} IS NOT NULL AND NEW.${column} IS DISTINCT FROM OLD.${column}) EXECUTE FUNCTION money_stays()`;

/** What an entry does to one account; nothing is nought. */
const MOVED = `
CREATE FUNCTION entry_moves(moved uuid, code text) RETURNS numeric LANGUAGE sql STABLE AS $$
  SELECT coalesce(sum(amount_minor), 0) FROM posting WHERE entry_id = moved AND account_code = code
$$`;

const INVOICE_IN_THE_BOOKS = `
CREATE FUNCTION invoice_in_the_books() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  income text := CASE NEW.kind WHEN 'dues' THEN '4000' WHEN 'course fee' THEN '4010' ELSE '4020' END;
BEGIN
  IF entry_moves(NEW.entry_id, '1100') <> NEW.amount_minor OR entry_moves(NEW.entry_id, income) <> -NEW.amount_minor THEN
    ${refused('invoice % of % is not what its entry says', 'NEW.number, NEW.amount_minor', 'invoice_in_the_books')}
  END IF;
  RETURN NULL;
END $$`;

/**
 * A payment's entry puts its amount where money of its kind lies, takes what it paid at once off what members owe, and
 * owes them the rest. One that is taken back has its entry reversed, pays nothing, and stands for no line of the bank.
 */
const PAYMENT_CHECK = `
CREATE FUNCTION payment_in_the_books_check(checked uuid) RETURNS void LANGUAGE plpgsql AS $$
DECLARE
  paid payment%ROWTYPE;
  at_once numeric;
  lies_in text;
BEGIN
  SELECT * INTO paid FROM payment WHERE id = checked;
  lies_in := CASE paid.method WHEN 'cash' THEN '1000' WHEN 'cheque' THEN '1010' WHEN 'card' THEN '1030' ELSE '1040' END;
  SELECT coalesce(sum(amount_minor), 0) INTO at_once FROM payment_allocation
   WHERE payment_id = checked AND credit_entry_id IS NULL;
  IF entry_moves(paid.entry_id, lies_in) <> paid.amount_minor
     OR entry_moves(paid.entry_id, '1100') <> -at_once
     OR entry_moves(paid.entry_id, '2100') <> at_once - paid.amount_minor THEN
    ${refused('payment % of % is not what its entry says', 'paid.receipt_number, paid.amount_minor', 'payment_in_the_books')}
  END IF;
  IF paid.taken_back_at IS NULL THEN RETURN; END IF;
  IF NOT EXISTS (SELECT 1 FROM entry WHERE reverses_id = paid.entry_id) THEN
    ${refused('payment % is taken back and its entry stands', 'paid.receipt_number', 'payment_taken_back_in_the_books')}
  END IF;
  IF EXISTS (SELECT 1 FROM payment_allocation WHERE payment_id = checked AND released_at IS NULL) THEN
    ${refused('payment % is taken back and still pays an invoice', 'paid.receipt_number', 'payment_taken_back_frees_invoices')}
  END IF;
  IF EXISTS (SELECT 1 FROM line_match WHERE payment_id = checked AND taken_back_at IS NULL) THEN
    ${refused('payment % is taken back and stands for a line', 'paid.receipt_number', 'payment_taken_back_frees_its_line')}
  END IF;
END $$`;

const PAYMENT_CHECKED = `
CREATE FUNCTION payment_in_the_books() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN PERFORM payment_in_the_books_check(NEW.id); RETURN NULL; END $$`;

/** Credit used later has an entry of its own; a share is given up only with its payment, and its entry with it. */
const ALLOCATION_IN_THE_BOOKS = `
CREATE FUNCTION payment_allocation_in_the_books() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM payment_in_the_books_check(NEW.payment_id);
  IF NEW.credit_entry_id IS NOT NULL AND (
    entry_moves(NEW.credit_entry_id, '2100') <> NEW.amount_minor OR entry_moves(NEW.credit_entry_id, '1100') <> -NEW.amount_minor
  ) THEN
    ${refused('share % of credit is not what its entry says', 'NEW.id', 'payment_allocation_in_the_books')}
  END IF;
  IF NEW.released_at IS NOT NULL AND (
    EXISTS (SELECT 1 FROM payment WHERE id = NEW.payment_id AND taken_back_at IS NULL)
    OR NEW.credit_entry_id IS NOT NULL AND NOT EXISTS (SELECT 1 FROM entry WHERE reverses_id = NEW.credit_entry_id)
  ) THEN
    ${refused('share % is given up and its payment or entry stands', 'NEW.id', 'payment_allocation_given_up_with_its_payment')}
  END IF;
  RETURN NULL;
END $$`;

/** The entry of an invoice stands, and that of a payment as long as the payment does. */
const REVERSED_WITH_ITS_MONEY = `
CREATE FUNCTION entry_reversed_with_its_money() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT 1 FROM invoice WHERE entry_id = NEW.reverses_id)
     OR EXISTS (SELECT 1 FROM payment WHERE entry_id = NEW.reverses_id AND taken_back_at IS NULL) THEN
    ${refused('entry % reverses one whose invoice or payment stands', 'NEW.id', 'entry_reversed_with_its_money')}
  END IF;
  RETURN NULL;
END $$`;

/** Holds the payment first, so that a match and a take-back of the same moment see each other. */
const MATCH_OF_A_LIVE_PAYMENT = `
CREATE FUNCTION line_match_of_a_live_payment() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  paid payment%ROWTYPE;
BEGIN
  SELECT * INTO paid FROM payment WHERE id = NEW.payment_id FOR NO KEY UPDATE;
  IF paid.taken_back_at IS NOT NULL THEN
    ${refused('match % joins a payment that was taken back', 'NEW.id', 'line_match_of_a_live_payment')}
  END IF;
  RETURN NULL;
END $$`;

const afterwards = (name: string, table: string, when: string, condition = ''): string =>
  `CREATE CONSTRAINT TRIGGER ${name} AFTER ${when} ON ${table} DEFERRABLE INITIALLY DEFERRED FOR EACH ROW ${condition} EXECUTE FUNCTION ${name}()`;

const RULES: readonly string[] = [
  MONEY_STAYS,
  MOVED,
  INVOICE_IN_THE_BOOKS,
  PAYMENT_CHECK,
  PAYMENT_CHECKED,
  ALLOCATION_IN_THE_BOOKS,
  REVERSED_WITH_ITS_MONEY,
  MATCH_OF_A_LIVE_PAYMENT,
  ...Object.entries(STAYING).flatMap(staying),
  ...Object.entries(ENDS).map(ending),
  afterwards('invoice_in_the_books', 'invoice', 'INSERT'),
  afterwards('payment_in_the_books', 'payment', 'INSERT OR UPDATE OF taken_back_at'),
  afterwards('payment_allocation_in_the_books', 'payment_allocation', 'INSERT OR UPDATE OF released_at'),
  afterwards('entry_reversed_with_its_money', 'entry', 'INSERT', 'WHEN (NEW.reverses_id IS NOT NULL)'),
  `CREATE TRIGGER line_match_of_a_live_payment AFTER INSERT ON line_match FOR EACH ROW
    WHEN (NEW.payment_id IS NOT NULL) EXECUTE FUNCTION line_match_of_a_live_payment()`,
  `ALTER TABLE "payment_allocation" ADD CONSTRAINT "payment_allocation_has_its_entry" UNIQUE ("credit_entry_id")`,
];

export class MoneyHoldsByItself1700000000009 implements MigrationInterface {
  async up(queryRunner: QueryRunner): Promise<void> {
    for (const rule of RULES) await queryRunner.query(rule);
  }

  /** Dropping a function takes its triggers along. */
  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      `ALTER TABLE "payment_allocation" DROP CONSTRAINT "payment_allocation_has_its_entry"`,
    );
    for (const name of [
      'line_match_of_a_live_payment()',
      'entry_reversed_with_its_money()',
      'payment_allocation_in_the_books()',
      'payment_in_the_books()',
      'payment_in_the_books_check(uuid)',
      'invoice_in_the_books()',
      'entry_moves(uuid, text)',
      'money_stays()',
    ])
      await queryRunner.query(`DROP FUNCTION ${name} CASCADE`);
  }
}
