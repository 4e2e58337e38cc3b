import { badParameter, missingParameter, unknownParameter } from './service-error';

export type Fields = Record<string, unknown>;

export const isFields = (value: unknown): value is Fields =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** Reads form-encoded parameters, where every number is text and an empty text means "not given". */
export class Params {
  private readonly fields: Fields;

  constructor(
    source: unknown,
    private readonly path = '',
  ) {
    if (source !== undefined && !isFields(source)) throw badParameter(path, `Invalid object: ${path}`);
    this.fields = source ?? {};
  }

  text(key: string, maxLength = 5000): string | undefined {
    const value = this.fields[key];
    if (value === undefined || value === '') return undefined;
    if (typeof value !== 'string') throw badParameter(this.name(key), `Invalid string: ${this.name(key)}`);
    if (value.length > maxLength)
      throw badParameter(this.name(key), `${this.name(key)} is longer than ${maxLength}`);
    return value;
  }

  requiredText(key: string, maxLength?: number): string {
    const value = this.text(key, maxLength);
    if (value === undefined) throw missingParameter(this.name(key));
    return value;
  }

  oneOf<T extends string>(key: string, allowed: readonly T[]): T | undefined {
    const value = this.text(key);
    const found = allowed.find((one) => one === value);
    if (value !== undefined && found === undefined)
      throw badParameter(this.name(key), `${this.name(key)} must be one of ${allowed.join(', ')}`);
    return found;
  }

  webAddress(key: string): string | undefined {
    const value = this.text(key);
    if (value !== undefined && !isWebAddress(value))
      throw badParameter(this.name(key), `Not a valid URL: ${this.name(key)}`, 'url_invalid');
    return value;
  }

  wholeNumber(key: string, { min, max }: { min: number; max: number }): number | undefined {
    const value = this.text(key);
    if (value === undefined) return undefined;
    const number = /^-?\d{1,15}$/.test(value) ? Number(value) : Number.NaN;
    if (!(number >= min && number <= max))
      throw badParameter(this.name(key), `${this.name(key)} must be a whole number from ${min} to ${max}`);
    return number;
  }

  requiredWholeNumber(key: string, range: { min: number; max: number }): number {
    const value = this.wholeNumber(key, range);
    if (value === undefined) throw missingParameter(this.name(key));
    return value;
  }

  group(key: string): Params {
    return new Params(this.fields[key] === '' ? undefined : this.fields[key], this.name(key));
  }

  groups(key: string): Params[] {
    return this.array(key).map((value, index) => new Params(value, `${this.name(key)}[${index}]`));
  }

  texts(key: string): string[] {
    return this.array(key).map((value) => {
      if (typeof value !== 'string') throw badParameter(this.name(key), `Invalid array: ${this.name(key)}`);
      return value;
    });
  }

  /** Up to 50 pairs of short texts. */
  metadata(key: string): Record<string, string> {
    const group = this.group(key);
    const keys = Object.keys(group.fields);
    if (keys.length > 50) throw badParameter(this.name(key), `${this.name(key)} has more than 50 keys`);
    return Object.fromEntries(keys.map((one) => [one, group.text(one, 500) ?? '']));
  }

  allowOnly(allowed: readonly string[]): void {
    const stranger = Object.keys(this.fields).find((key) => !allowed.includes(key));
    if (stranger !== undefined) throw unknownParameter(this.name(stranger));
  }

  has(key: string): boolean {
    return Object.hasOwn(this.fields, key);
  }

  private array(key: string): unknown[] {
    const value = this.fields[key];
    if (value === undefined || value === '') return [];
    if (!Array.isArray(value)) throw badParameter(this.name(key), `Invalid array: ${this.name(key)}`);
    return value;
  }

  private name(key: string): string {
    return this.path ? `${this.path}[${key}]` : key;
  }
}

function isWebAddress(text: string): boolean {
  return URL.canParse(text) && ['http:', 'https:'].includes(new URL(text).protocol);
}
