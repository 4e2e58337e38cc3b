/** What was typed and not yet sent, kept on this device for one person and one place. */
export interface Draft<T> {
  value: T;
  /** ISO instant of the last keystroke. */
  keptAt: string;
}

const PREFIX = 'ferrite-draft';
const keyOf = (person: string, place: string): string => `${PREFIX}:${person}:${place}`;

function isDraft(value: unknown): value is Draft<unknown> {
  return typeof value === 'object' && value !== null && 'value' in value && 'keptAt' in value;
}

/** The draft of a place, or undefined when there is none, it cannot be read, or storage is shut off. */
export function readDraft<T>(person: string, place: string): Draft<T> | undefined {
  try {
    const parsed: unknown = JSON.parse(localStorage.getItem(keyOf(person, place)) ?? 'null');
    return isDraft(parsed) ? (parsed as Draft<T>) : undefined;
  } catch {
    return undefined;
  }
}

/** @returns the draft as kept, or undefined when the device would not keep it (storage full or shut off). */
export function keepDraft<T>(
  person: string,
  place: string,
  value: T,
  now = new Date(),
): Draft<T> | undefined {
  const draft = { value, keptAt: now.toISOString() };
  try {
    localStorage.setItem(keyOf(person, place), JSON.stringify(draft));
    return draft;
  } catch {
    return undefined;
  }
}

export function dropDraft(person: string, place: string): void {
  try {
    localStorage.removeItem(keyOf(person, place));
  } catch {
    // Nothing can be kept there, so there is nothing to drop.
  }
}
