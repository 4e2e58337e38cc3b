type Line = readonly [day: string, description: string, amountMinor: number];

const decimal = (minor: number): string => {
  const text = String(Math.abs(minor)).padStart(3, '0');
  return `${minor < 0 ? '-' : ''}${text.slice(0, -2)}.${text.slice(-2)}`;
};

/** A statement file that adds up, oldest line first. */
export function statementCsv(openingMinor: number, ...lines: Line[]): string {
  let balance = openingMinor;
  const rows = lines.map(([day, description, amountMinor]) => {
    balance += amountMinor;
    return `${day},"${description}",${decimal(amountMinor)},${decimal(balance)}`;
  });
  return ['date,description,amount,balance', ...rows].join('\n');
}
