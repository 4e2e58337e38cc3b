import fc from 'fast-check';
import { BadLine, readDecimal, readStatement } from './statement-csv.rules';

const HEAD = 'date,description,amount,balance';
const read = (...lines: string[]) => readStatement(lines.join('\n'), 'GBP', 2, '2026-10-02');
const faultOf = (...lines: string[]) => {
  try {
    read(...lines);
  } catch (error) {
    if (error instanceof BadLine) return `${error.line}: ${error.reason}`;
    throw error;
  }
  return 'none';
};

describe('reading a statement', () => {
  it('reads the lines and works out what the account opened and closed with', () => {
    const statement = read(
      HEAD,
      '2026-09-01,STO Peverell J,24.00,3436.86',
      '2026-09-03,Power,-86.40,"3,350.46"',
    );
    expect(statement).toEqual({
      openingMinor: 341_286,
      closingMinor: 335_046,
      lines: [
        { day: '2026-09-01', description: 'STO Peverell J', amountMinor: 2400, balanceMinor: 343_686 },
        { day: '2026-09-03', description: 'Power', amountMinor: -8640, balanceMinor: 335_046 },
      ],
    });
  });

  it('takes the columns in any order, passes over others, and does not mind a byte order mark or Windows line ends', () => {
    const statement = readStatement(
      '\uFEFFBalance,Branch,Amount,Description,Date\r\n124.00,7,24.00,In,2026-09-01\r\n',
      'GBP',
      2,
      '2026-10-02',
    );
    expect(statement.lines).toEqual([
      { day: '2026-09-01', description: 'In', amountMinor: 2400, balanceMinor: 12_400 },
    ]);
  });

  it('turns a file that is newest first', () => {
    const statement = read(HEAD, '2026-09-02,b,-4.00,120.00', '2026-09-01,a,24.00,124.00');
    expect(statement.lines.map(({ description }) => description)).toEqual(['a', 'b']);
    expect(statement).toMatchObject({ openingMinor: 10_000, closingMinor: 12_000 });
  });

  it.each([
    ['no heading', [''], '1: the file is empty.'],
    ['no line', [HEAD], '2: there is no line under the heading.'],
    [
      'a column missing',
      ['date,amount,balance', '2026-09-01,1.00,1.00'],
      '1: the heading has no description. It names date, description, amount, balance.',
    ],
    [
      'a column twice',
      [`${HEAD},amount`, '2026-09-01,a,1.00,1.00,1.00'],
      '1: the heading names amount twice.',
    ],
    [
      'a day that is none',
      [HEAD, '2026-02-30,a,1.00,1.00'],
      '2: “2026-02-30” is not a date such as 2026-09-30.',
    ],
    [
      'a day the other way round',
      [HEAD, '30/09/2026,a,1.00,1.00'],
      '2: “30/09/2026” is not a date such as 2026-09-30.',
    ],
    ['a day to come', [HEAD, '2026-10-03,a,1.00,1.00'], '2: 2026-10-03 has not come yet.'],
    ['no description', [HEAD, '2026-09-01, ,1.00,1.00'], '2: the description is empty.'],
    ['too many decimals', [HEAD, '2026-09-01,a,1.005,1.00'], '2: “1.005” is no amount such as -12.50.'],
    [
      'words for money',
      [HEAD, '2026-09-01,a,1.00,1.00', '2026-09-01,a,ten,1.00'],
      '3: “ten” is no amount such as -12.50.',
    ],
    ['nothing moved', [HEAD, '2026-09-01,a,0.00,1.00'], '2: the amount is nothing.'],
    [
      'a column too many',
      [HEAD, '2026-09-01,a,1.00,1.00', '2026-09-01,a,1.00,2.00,x'],
      '3: it has more or fewer columns than the heading.',
    ],
    ['an open quotation mark', [HEAD, '2026-09-01,"a,1.00,1.00'], '2: its quotation marks do not close.'],
    [
      'balances that do not add up',
      [HEAD, '2026-09-01,a,24.00,124.00', '2026-09-02,b,-4.00,119.00'],
      '3: 124.00 and −4.00 make 120.00, but the balance says 119.00. A line is missing, or one was changed.',
    ],
  ])('names the line and the fault: %s', (_what, lines, fault) => {
    expect(faultOf(...lines)).toBe(fault);
  });

  it('refuses a file longer than the limit', () => {
    const lines = Array.from({ length: 5001 }, (_, index) => `2026-09-01,a,1.00,${index + 1}.00`);
    expect(faultOf(HEAD, ...lines)).toMatch(/^5002: a file may have 5000 lines/);
  });
});

describe('reading a decimal', () => {
  it.each([
    ['24', 2, 2400],
    ['24.5', 2, 2450],
    ['-6.50', 2, -650],
    ['−6.50', 2, -650],
    ['+1,234.56', 2, 123_456],
    ['0.29', 2, 29],
    ['1.234', 3, 1234],
    ['100', 0, 100],
  ])('reads %s with %i decimals as %i', (text, digits, minor) => {
    expect(readDecimal(text, digits)).toBe(minor);
  });

  it.each([
    '',
    '.5',
    '1.',
    '1e3',
    '0x10',
    '1,23',
    '--1',
    '1.234',
    'NaN',
    'Infinity',
    '9999999999999999',
    '£5',
  ])('takes %s for no amount', (text) => {
    expect(readDecimal(text, 2)).toBeUndefined();
  });

  it('reads back every amount of pounds and pence without a penny lost', () => {
    fc.assert(
      fc.property(fc.integer({ min: -99_999_999_999, max: 99_999_999_999 }), (minor) => {
        const pence = String(Math.abs(minor)).padStart(3, '0');
        const text = `${minor < 0 ? '-' : ''}${pence.slice(0, -2)}.${pence.slice(-2)}`;
        expect(readDecimal(text, 2)).toBe(minor);
      }),
    );
  });
});
