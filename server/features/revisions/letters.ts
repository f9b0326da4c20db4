/** I and O are skipped: on a drawing they read as 1 and 0. */
const alphabet = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** The letter of the n-th published revision, from 0: A … Z without I and O, then AA, AB … */
export function letterOf(index: number): string {
  const { length } = alphabet;
  const last = alphabet.charAt(index % length);
  return index < length ? last : letterOf(Math.floor(index / length) - 1) + last;
}

/** The place of a letter in that order. */
export function indexOfLetter(letter: string): number {
  return [...letter].reduce((index, sign) => (index + 1) * alphabet.length + alphabet.indexOf(sign), -1);
}

/** What the next revision of a family is called, given the letters that it has issued. */
export function nextLetter(issued: readonly string[]): string {
  return letterOf(Math.max(-1, ...issued.map(indexOfLetter)) + 1);
}
