"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.Bank = void 0;
exports.standingLines = standingLines;
exports.loose = loose;
const decimal = (minor) => (minor / 100).toFixed(2);
/** The club's current account as its bank sees it: what came in and went out, month by month. */
class Bank {
    balanceMinor;
    lines = [];
    constructor(balanceMinor) {
        this.balanceMinor = balanceMinor;
    }
    note(line) {
        this.lines.push(line);
    }
    /** The month's statement as a file, and its lines in the file's order. Takes the lines with it. */
    statement(month) {
        const isOfMonth = ({ day }) => day.toPlainYearMonth().equals(month);
        const lines = this.lines.filter(isOfMonth).sort((a, b) => (a.day.toString() < b.day.toString() ? -1 : 1));
        const rows = lines.map(({ day, description, amountMinor }) => {
            this.balanceMinor += amountMinor;
            return [day.toString(), description, decimal(amountMinor), decimal(this.balanceMinor)].join(',');
        });
        return {
            name: `current-account-${month.toString()}.csv`,
            csv: ['date,description,amount,balance', ...rows, ''].join('\n'),
            lines,
        };
    }
}
exports.Bank = Bank;
/** What leaves the account every month whoever pays dues. */
function standingLines(month) {
    const on = (day) => month.toPlainDate({ day });
    return [
        {
            day: on(3),
            description: 'DD NORTHWAIR POWER',
            amountMinor: -8640 + month.month * 35,
            accountCode: '5100',
        },
        { day: on(11), description: 'BACS MILLBECK HALL TRUST', amountMinor: -22_000, accountCode: '5100' },
        {
            day: on(17),
            description: 'CARD WHARFSIDE COIL CO',
            amountMinor: -9000 - month.month * 119,
            accountCode: '5200',
        },
    ];
}
/** What nobody has explained yet on the last statement. */
function loose(month) {
    const on = (day) => month.toPlainDate({ day });
    return [
        { day: on(21), description: 'FPI T FENN REF 0922', amountMinor: 3600 },
        { day: on(24), description: 'ACCOUNT CHARGE', amountMinor: -650 },
        { day: on(26), description: 'FPI K AMPAH', amountMinor: 2000 },
        { day: on(27), description: 'FPI D HALE RF00LRB1275', amountMinor: 1275 },
        { day: on(28), description: 'INTEREST', amountMinor: 183 },
    ];
}
//# sourceMappingURL=bank.js.map