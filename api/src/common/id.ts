/** Any uuid PostgreSQL would take in its own spelling; which version made it is nobody's business here. */
export const ID = /^[0-9a-f]{8}-(?:[0-9a-f]{4}-){3}[0-9a-f]{12}$/i;

export function isId(text: string): boolean {
  return ID.test(text);
}
