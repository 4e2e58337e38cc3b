"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.seedMoney = seedMoney;
const node_crypto_1 = require("node:crypto");
const invoices_service_1 = require("@ferrite-row/api/dues/invoices.service");
const tiers_service_1 = require("@ferrite-row/api/dues/tiers.service");
const till_service_1 = require("@ferrite-row/api/dues/till.service");
const reconciliation_service_1 = require("@ferrite-row/api/reconciliation/reconciliation.service");
const statement_import_service_1 = require("@ferrite-row/api/reconciliation/statement-import.service");
const people_1 = require("../people");
const stage_set_1 = require("../stage-set");
const bank_1 = require("./bank");
const bills_1 = require("./bills");
const MONTHS = 9;
const OPENING_MINOR = 284_512;
/** A year of dues: raised, paid by card, cash, cheque and transfer, and nine statements, the last one half settled. */
async function seedMoney(set) {
    const { clock, calendar } = set;
    clock.set(calendar.at(calendar.today.subtract({ days: 360 }), 9));
    await seedTiers(set);
    const bank = new bank_1.Bank(OPENING_MINOR);
    const bills = (0, bills_1.billsUntil)(calendar.today);
    const acts = [...billActs(set, bank, bills), ...statementActs(set, bank)];
    acts.sort((a, b) => compare(a.day.toString(), b.day.toString()) || a.rank - b.rank);
    for (const { day, rank, run } of acts) {
        const at = calendar.at(day, 9 + rank);
        clock.set(at < calendar.now ? at : calendar.now);
        await run();
    }
    return { invoices: bills.length, statements: MONTHS };
}
const compare = (a, b) => (a < b ? -1 : a > b ? 1 : 0);
async function seedTiers({ context, calendar, as }) {
    const tiers = context.get(tiers_service_1.TiersService);
    const ids = new Map();
    for (const tier of bills_1.TIERS)
        ids.set(tier.name, (await tiers.create(as('ines'), { ...tier })).id);
    const fromOn = calendar.today.subtract({ days: 360 }).toString();
    for (const { key } of people_1.PEOPLE) {
        await tiers.assign(as('ines'), { personId: as(key).personId, tierId: (0, stage_set_1.found)(ids, (0, bills_1.tierOf)(key)), fromOn });
    }
}
function billActs(set, bank, bills) {
    return bills.flatMap((bill, index) => {
        let raised;
        const raise = {
            day: bill.raisedOn,
            rank: 0,
            run: async () => {
                raised = await raiseOne(set, bill);
            },
        };
        const { paidOn } = bill;
        if (paidOn === null || paidOn.toString() > set.calendar.today.toString())
            return [raise];
        const pay = { day: paidOn, rank: 1, run: () => payOne(set, bank, bill, raised, index) };
        return [raise, pay];
    });
}
async function raiseOne({ context, as }, bill) {
    const { who, kind, description, amountMinor, dueOn } = bill;
    const wanted = { personId: as(who).personId, kind, description, amountMinor, dueOn: dueOn.toString() };
    return context.get(invoices_service_1.InvoicesService).raise(as('ines'), wanted);
}
async function payOne(set, bank, bill, raised, index) {
    if (!raised || !bill.paidOn)
        throw new Error('A bill was paid before it was raised.');
    const { context, calendar, as } = set;
    const { way, amountMinor, paidOn, who } = bill;
    if (way === 'transfer' && paidOn.toPlainYearMonth().equals(calendar.today.toPlainYearMonth()) === false) {
        // The statement brings it: its reference finds the invoice.
        const surname = as(who).name.split(' ').at(-1)?.toUpperCase() ?? '';
        bank.note({ day: paidOn, description: `FPI ${surname} ${raised.reference}`, amountMinor });
        return;
    }
    const till = context.get(till_service_1.TillService);
    const payment = {
        personId: as(who).personId,
        method: way,
        amountMinor,
        receivedOn: paidOn.toString(),
        invoiceIds: [raised.id],
        note: '',
        takenById: way === 'card' ? null : as('ines').personId,
        clientKey: null,
        cardSessionId: way === 'card' ? `cs_demo_${index}_${(0, node_crypto_1.randomUUID)()}` : null,
    };
    await context.database.transaction((manager) => till.record(manager, payment));
    if (way === 'card')
        bank.note({ day: paidOn, description: `CARD SETTLEMENT ${index}`, amountMinor, accountCode: '1030' });
    if (way === 'cash')
        bank.note({ day: paidOn, description: 'CASH PAID IN', amountMinor, accountCode: '1000' });
}
function statementActs(set, bank) {
    const thisMonth = set.calendar.today.toPlainYearMonth();
    return Array.from({ length: MONTHS }, (_, index) => {
        const month = thisMonth.subtract({ months: MONTHS - index });
        const isLast = index === MONTHS - 1;
        const second = month.add({ months: 1 }).toPlainDate({ day: 2 });
        const day = second.toString() < set.calendar.today.toString() ? second : set.calendar.today;
        return { day, rank: 2, run: () => importOne(set, bank, month, isLast) };
    });
}
async function importOne(set, bank, month, isLast) {
    const { context, as } = set;
    for (const line of [...(0, bank_1.standingLines)(month), ...(isLast ? (0, bank_1.loose)(month) : [])])
        bank.note(line);
    const { name, csv, lines } = bank.statement(month);
    const file = { originalname: name, buffer: Buffer.from(csv) };
    const statement = await context.get(statement_import_service_1.StatementImportService).import(as('ines'), file);
    const shown = await context.get(reconciliation_service_1.ReconciliationService).show(as('ines'), statement.id);
    const toSettle = isLast ? [] : shown.lines.filter(({ match }) => match === null);
    for (const { id, description, amountMinor } of toSettle) {
        const line = lines.find((one) => one.description === description && one.amountMinor === amountMinor);
        if (!line?.accountCode)
            throw new Error(`Nothing settles the line ${description} of ${month.toString()}.`);
        await context
            .get(reconciliation_service_1.ReconciliationService)
            .match(as('ines'), id, { accountCode: line.accountCode, note: '' });
    }
}
//# sourceMappingURL=year.js.map