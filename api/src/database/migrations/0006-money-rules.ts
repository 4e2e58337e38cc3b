/** What a check constraint cannot say: rules over several rows, and rows that never change. */

/** An entry has the postings it was written with, they sum to zero, and one that reverses is the exact mirror image. */
const ENTRY_BALANCES = `
CREATE FUNCTION entry_balances_check(checked uuid) RETURNS void LANGUAGE plpgsql AS $$
DECLARE
  written entry%ROWTYPE;
  sides bigint;
  total numeric;
BEGIN
  SELECT * INTO written FROM entry WHERE id = checked;
  SELECT count(*), coalesce(sum(amount_minor), 0) INTO sides, total FROM posting WHERE entry_id = checked;
  IF sides <> written.posting_count OR total <> 0 THEN
    RAISE EXCEPTION 'entry % has % postings that sum to %', checked, sides, total
      USING ERRCODE = 'check_violation', CONSTRAINT = 'entry_balances';
  END IF;
  IF written.reverses_id IS NOT NULL AND EXISTS (
    SELECT 1 FROM posting WHERE entry_id IN (checked, written.reverses_id)
     GROUP BY account_code HAVING sum(amount_minor) <> 0
  ) THEN
    RAISE EXCEPTION 'entry % does not mirror the one it reverses', checked
      USING ERRCODE = 'check_violation', CONSTRAINT = 'entry_reverses_exactly';
  END IF;
END $$`;

const ENTRY_CHECKED = `
CREATE FUNCTION entry_checked() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN PERFORM entry_balances_check(NEW.id); RETURN NULL; END $$`;

const POSTING_CHECKED = `
CREATE FUNCTION posting_checked() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN PERFORM entry_balances_check(NEW.entry_id); RETURN NULL; END $$`;

const NEVER_CHANGES = `
CREATE FUNCTION books_never_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% on % is refused: a correction is an entry that reverses another', TG_OP, TG_TABLE_NAME
    USING ERRCODE = 'check_violation', CONSTRAINT = 'books_never_change';
END $$`;

/**
 * Holds invoice and payment before it sums, so that of two allocations at once the later sees the earlier. NO KEY
 * UPDATE, because the foreign keys of both already hold KEY SHARE.
 */
const ALLOCATION_FITS = `
CREATE FUNCTION payment_allocation_fits() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE
  billed invoice%ROWTYPE;
  paid payment%ROWTYPE;
  used numeric;
BEGIN
  SELECT * INTO billed FROM invoice WHERE id = NEW.invoice_id FOR NO KEY UPDATE;
  SELECT * INTO paid FROM payment WHERE id = NEW.payment_id FOR NO KEY UPDATE;
  IF billed.person_id <> paid.person_id THEN
    RAISE EXCEPTION 'payment % is of another person than invoice %', paid.id, billed.id
      USING ERRCODE = 'check_violation', CONSTRAINT = 'payment_allocation_same_person';
  END IF;
  SELECT coalesce(sum(amount_minor), 0) INTO used FROM payment_allocation
   WHERE invoice_id = billed.id AND released_at IS NULL;
  IF used > billed.amount_minor THEN
    RAISE EXCEPTION 'invoice % would be paid % of %', billed.id, used, billed.amount_minor
      USING ERRCODE = 'check_violation', CONSTRAINT = 'invoice_not_overpaid';
  END IF;
  SELECT coalesce(sum(amount_minor), 0) INTO used FROM payment_allocation
   WHERE payment_id = paid.id AND released_at IS NULL;
  IF used > paid.amount_minor OR paid.taken_back_at IS NOT NULL THEN
    RAISE EXCEPTION 'payment % would pay % of %', paid.id, used, paid.amount_minor
      USING ERRCODE = 'check_violation', CONSTRAINT = 'payment_not_overspent';
  END IF;
  RETURN NULL;
END $$`;

const MATCH_MOVES_THE_AMOUNT = `
CREATE FUNCTION line_match_moves_the_amount() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF (SELECT amount_minor FROM statement_line WHERE id = NEW.line_id) IS DISTINCT FROM
     (SELECT sum(amount_minor) FROM posting WHERE entry_id = NEW.entry_id AND account_code = '1020') THEN
    RAISE EXCEPTION 'match % does not move the amount of its line', NEW.id
      USING ERRCODE = 'check_violation', CONSTRAINT = 'line_match_moves_the_amount';
  END IF;
  IF NEW.payment_id IS NOT NULL AND
     (SELECT amount_minor FROM statement_line WHERE id = NEW.line_id) IS DISTINCT FROM
     (SELECT amount_minor FROM payment WHERE id = NEW.payment_id) THEN
    RAISE EXCEPTION 'match % joins a payment of another amount', NEW.id
      USING ERRCODE = 'check_violation', CONSTRAINT = 'line_match_same_amount';
  END IF;
  RETURN NULL;
END $$`;

const neverChanges = (table: string): string[] => [
  `CREATE TRIGGER ${table}_never_changes BEFORE UPDATE OR DELETE ON ${table} FOR EACH ROW EXECUTE FUNCTION books_never_change()`,
  `CREATE TRIGGER ${table}_never_emptied BEFORE TRUNCATE ON ${table} FOR EACH STATEMENT EXECUTE FUNCTION books_never_change()`,
];

export const RULES: readonly string[] = [
  ENTRY_BALANCES,
  ENTRY_CHECKED,
  POSTING_CHECKED,
  NEVER_CHANGES,
  ALLOCATION_FITS,
  MATCH_MOVES_THE_AMOUNT,
  `CREATE CONSTRAINT TRIGGER entry_balances AFTER INSERT ON entry DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION entry_checked()`,
  `CREATE CONSTRAINT TRIGGER posting_balances AFTER INSERT ON posting DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION posting_checked()`,
  ...neverChanges('entry'),
  ...neverChanges('posting'),
  `CREATE TRIGGER payment_allocation_fits AFTER INSERT OR UPDATE OF amount_minor, invoice_id, payment_id ON payment_allocation FOR EACH ROW EXECUTE FUNCTION payment_allocation_fits()`,
  `CREATE TRIGGER line_match_moves_the_amount AFTER INSERT ON line_match FOR EACH ROW EXECUTE FUNCTION line_match_moves_the_amount()`,
];

/** Dropping a function takes its triggers along. */
export const DROP_RULES: readonly string[] = [
  `DROP FUNCTION line_match_moves_the_amount() CASCADE`,
  `DROP FUNCTION payment_allocation_fits() CASCADE`,
  `DROP FUNCTION books_never_change() CASCADE`,
  `DROP FUNCTION posting_checked() CASCADE`,
  `DROP FUNCTION entry_checked() CASCADE`,
  `DROP FUNCTION entry_balances_check(uuid)`,
];

/** The club's chart of accounts; the last column says which may stand against a statement line by hand. */
export const ACCOUNTS_OF_THE_BOOKS = `
INSERT INTO account (code, name, kind, settles_lines) VALUES
  ('1000', 'Cash box', 'asset', true),
  ('1010', 'Cheques in hand', 'asset', false),
  ('1020', 'Current account', 'asset', false),
  ('1030', 'Card money on its way', 'asset', true),
  ('1040', 'Transfers on their way', 'asset', false),
  ('1100', 'Members owe', 'asset', false),
  ('2100', 'Members in credit', 'liability', false),
  ('3000', 'Club funds', 'equity', false),
  ('4000', 'Dues', 'income', false),
  ('4010', 'Course fees', 'income', false),
  ('4020', 'Kits', 'income', false),
  ('4900', 'Other income', 'income', true),
  ('5000', 'Bank and card charges', 'expense', true),
  ('5100', 'Hall and power', 'expense', true),
  ('5200', 'Workshop supplies', 'expense', true),
  ('5900', 'Other costs', 'expense', true)`;
