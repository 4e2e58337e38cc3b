import type { Temporal } from 'temporal-polyfill';

type Day = Temporal.PlainDate;

export interface BankLine {
  day: Day;
  description: string;
  amountMinor: number;
  /** The account of the books it is settled against by hand; left out when its reference finds it. */
  accountCode?: string;
  /** The cheque it is, where it is one. */
  paymentId?: string;
}

const decimal = (minor: number): string => (minor / 100).toFixed(2);

/** The club's current account as its bank sees it: what came in and went out, month by month. */
export class Bank {
  private readonly lines: BankLine[] = [];

  constructor(private balanceMinor: number) {}

  note(line: BankLine): void {
    this.lines.push(line);
  }

  /** The month's statement as a file, and its lines in the file's order. Takes the lines with it. */
  statement(month: Temporal.PlainYearMonth): { name: string; csv: string; lines: BankLine[] } {
    const isOfMonth = ({ day }: BankLine): boolean => day.toPlainYearMonth().equals(month);
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

/** What leaves the account every month whoever pays dues. */
export function standingLines(month: Temporal.PlainYearMonth): BankLine[] {
  const on = (day: number): Day => month.toPlainDate({ day });
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
export function loose(month: Temporal.PlainYearMonth): BankLine[] {
  const on = (day: number): Day => month.toPlainDate({ day });
  return [
    { day: on(21), description: 'FPI T FENN REF 0922', amountMinor: 3600 },
    { day: on(24), description: 'ACCOUNT CHARGE', amountMinor: -650 },
    { day: on(26), description: 'FPI K AMPAH', amountMinor: 2000 },
    { day: on(27), description: 'FPI D HALE RF00LRB1275', amountMinor: 1275 },
    { day: on(28), description: 'INTEREST', amountMinor: 183 },
  ];
}
