export type Environment = Record<string, string | undefined>;

/** A value the program cannot do without; the message names it. */
export function required(environment: Environment, name: string): string {
  const value = environment[name];
  if (!value) throw new Error(`${name} is not set`);
  return value;
}

/** A whole number from 0 upwards; `fallback` when unset. */
export function wholeNumber(environment: Environment, name: string, fallback?: number): number {
  const text = environment[name] || fallback?.toString();
  if (text === undefined) throw new Error(`${name} is not set`);
  if (!/^\d{1,9}$/.test(text)) throw new Error(`${name} must be a whole number, not "${text}"`);
  return Number(text);
}

/** 0 asks the system for a free port. */
export function port(environment: Environment, name: string): number {
  const value = wholeNumber(environment, name);
  if (value > 65535) throw new Error(`${name} must be a port from 0 to 65535, not ${value}`);
  return value;
}
