/** From how little room on the field says how much is left. */
const NEARLY = 0.9;

const count = (characters: number): string =>
  characters === 1 ? '1 character' : `${characters.toLocaleString('en-GB')} characters`;

/** What is wrong with a text that is too long: how much has to go. */
export function tooLongWords(text: string, maxLength: number | undefined): string | undefined {
  if (maxLength === undefined || text.trim().length <= maxLength) return undefined;
  return `${count(text.trim().length - maxLength)} too long: at most ${count(maxLength)}.`;
}

/** How much room is left, once it is nearly full. */
export function roomWords(text: string, maxLength: number | undefined): string | undefined {
  if (maxLength === undefined || text.trim().length < maxLength * NEARLY) return undefined;
  return `${count(maxLength - text.trim().length)} left`;
}
