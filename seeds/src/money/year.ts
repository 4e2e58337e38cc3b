import { InvoicesService } from '@ferrite-row/api/dues/invoices.service';
import { TiersService } from '@ferrite-row/api/dues/tiers.service';
import { TillService } from '@ferrite-row/api/dues/till.service';
import { ReconciliationService } from '@ferrite-row/api/reconciliation/reconciliation.service';
import { StatementImportService } from '@ferrite-row/api/reconciliation/statement-import.service';
import type { Temporal } from 'temporal-polyfill';
import { PEOPLE } from '../people';
import { found, type StageSet } from '../stage-set';
import { Bank, loose, standingLines, type BankLine } from './bank';
import { billsUntil, tierOf, TIERS, type Bill } from './bills';

const MONTHS = 9;
const OPENING_MINOR = 284_512;

interface Raised {
  id: string;
  reference: string;
}

interface Act {
  day: Temporal.PlainDate;
  /** Among acts of one day: raising, then paying, then the statement. */
  rank: number;
  run: () => Promise<void>;
}

/** A year of dues: raised, paid by card, cash, cheque and transfer, and nine statements, the last one half settled. */
export async function seedMoney(set: StageSet): Promise<{ invoices: number; statements: number }> {
  const { clock, calendar } = set;
  clock.set(calendar.at(calendar.today.subtract({ days: 360 }), 9));
  await seedTiers(set);
  const bank = new Bank(OPENING_MINOR);
  const bills = billsUntil(calendar.today);
  const acts = [...billActs(set, bank, bills), ...statementActs(set, bank)];
  acts.sort((a, b) => compare(a.day.toString(), b.day.toString()) || a.rank - b.rank);
  for (const { day, rank, run } of acts) {
    const at = calendar.at(day, 9 + rank);
    clock.set(at < calendar.now ? at : calendar.now);
    await run();
  }
  return { invoices: bills.length, statements: MONTHS };
}

const compare = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

async function seedTiers({ context, calendar, as }: StageSet): Promise<void> {
  const tiers = context.get(TiersService);
  const ids = new Map<string, string>();
  for (const tier of TIERS) ids.set(tier.name, (await tiers.create(as('ines'), { ...tier })).id);
  const fromOn = calendar.today.subtract({ days: 360 }).toString();
  for (const { key } of PEOPLE) {
    await tiers.assign(as('ines'), { personId: as(key).personId, tierId: found(ids, tierOf(key)), fromOn });
  }
}

function billActs(set: StageSet, bank: Bank, bills: readonly Bill[]): Act[] {
  return bills.flatMap((bill, index) => {
    let raised: Raised | undefined;
    const raise: Act = {
      day: bill.raisedOn,
      rank: 0,
      run: async () => {
        raised = await raiseOne(set, bill);
      },
    };
    const { paidOn } = bill;
    if (paidOn === null || paidOn.toString() > set.calendar.today.toString()) return [raise];
    const pay: Act = { day: paidOn, rank: 1, run: () => payOne(set, bank, bill, raised, index) };
    return [raise, pay];
  });
}

async function raiseOne({ context, as }: StageSet, bill: Bill): Promise<Raised> {
  const { who, kind, description, amountMinor, dueOn } = bill;
  const wanted = { personId: as(who).personId, kind, description, amountMinor, dueOn: dueOn.toString() };
  return context.get(InvoicesService).raise(as('ines'), wanted);
}

async function payOne(
  set: StageSet,
  bank: Bank,
  bill: Bill,
  raised: Raised | undefined,
  index: number,
): Promise<void> {
  if (!raised || !bill.paidOn) throw new Error('A bill was paid before it was raised.');
  const { context, calendar, as } = set;
  const { way, amountMinor, paidOn, who } = bill;
  if (way === 'transfer' && paidOn.toPlainYearMonth().equals(calendar.today.toPlainYearMonth()) === false) {
    // The statement brings it: its reference finds the invoice.
    const surname = as(who).name.split(' ').at(-1)?.toUpperCase() ?? '';
    bank.note({ day: paidOn, description: `FPI ${surname} ${raised.reference}`, amountMinor });
    return;
  }
  const till = context.get(TillService);
  const payment = {
    personId: as(who).personId,
    method: way,
    amountMinor,
    receivedOn: paidOn.toString(),
    invoiceIds: [raised.id],
    note: '',
    takenById: way === 'card' ? null : as('ines').personId,
    clientKey: null,
    cardSessionId: way === 'card' ? `cs_demo_${index}` : null,
  };
  const paymentId = await context.database.transaction((manager) => till.record(manager, payment));
  if (way === 'card')
    bank.note({ day: paidOn, description: `CARD SETTLEMENT ${index}`, amountMinor, accountCode: '1030' });
  if (way === 'cheque')
    bank.note({ day: paidOn, description: `CHEQUE ${101_200 + index}`, amountMinor, paymentId });
  if (way === 'cash')
    bank.note({ day: paidOn, description: 'CASH PAID IN', amountMinor, accountCode: '1000' });
}

function statementActs(set: StageSet, bank: Bank): Act[] {
  const thisMonth = set.calendar.today.toPlainYearMonth();
  return Array.from({ length: MONTHS }, (_, index) => {
    const month = thisMonth.subtract({ months: MONTHS - index });
    const isLast = index === MONTHS - 1;
    const second = month.add({ months: 1 }).toPlainDate({ day: 2 });
    const day = second.toString() < set.calendar.today.toString() ? second : set.calendar.today;
    return { day, rank: 2, run: () => importOne(set, bank, month, isLast) };
  });
}

async function importOne(
  set: StageSet,
  bank: Bank,
  month: Temporal.PlainYearMonth,
  isLast: boolean,
): Promise<void> {
  const { context, as } = set;
  for (const line of [...standingLines(month), ...(isLast ? loose(month) : [])]) bank.note(line);
  const { name, csv, lines } = bank.statement(month);
  const file = { originalname: name, buffer: Buffer.from(csv) };
  const statement = await context.get(StatementImportService).import(as('ines'), file);
  const shown = await context.get(ReconciliationService).show(as('ines'), statement.id);
  for (const { id, description, amountMinor, match } of shown.lines) {
    const line = lines.find((one) => one.description === description && one.amountMinor === amountMinor);
    if (match !== null || !line || (isLast && !HALL.includes(line.accountCode ?? ''))) continue;
    await context.get(ReconciliationService).match(as('ines'), id, answerTo(line, month));
  }
}

/** What the treasurer has settled on the last statement so far: the hall. */
const HALL = ['5100'];

function answerTo({ paymentId, accountCode, description }: BankLine, month: Temporal.PlainYearMonth) {
  if (paymentId) return { paymentId };
  if (accountCode) return { accountCode, note: '' };
  throw new Error(`Nothing settles the line ${description} of ${month.toString()}.`);
}
