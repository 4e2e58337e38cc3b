/** What is said of an error in the log, by name: an error of the database carries every value of its query with it. */
const SAID = ['type', 'message', 'stack', 'code', 'query', 'table', 'column', 'constraint', 'requestId'];

/** @param error - as the logger has flattened it; anything at all may have been thrown. */
export function errorForLog(error: unknown): Record<string, unknown> {
  if (typeof error !== 'object' || error === null) return { type: typeof error };
  const said = Object.entries(error).filter(
    ([name, fact]) => SAID.includes(name) && (typeof fact === 'string' || typeof fact === 'number'),
  );
  return Object.fromEntries(said);
}
