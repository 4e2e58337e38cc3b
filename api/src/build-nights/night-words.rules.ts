/** `Hollis, Greta and Oona` */
export function listText(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}

/** `Larkmoor Twenty, night 15`; a night on its own by its title. */
export function nightName({ title, number }: { title: string; number: number | null }): string {
  return number === null ? title : `${title}, night ${number}`;
}
