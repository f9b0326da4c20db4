/** Without those that are mistaken for one another: 0 O, 1 l I. */
const LETTERS = 'abcdefghijkmnpqrstuvwxyz23456789';

/** Four groups of five random letters, to be read aloud: about 100 bits. */
export function suggestPassword(): string {
  const random = crypto.getRandomValues(new Uint8Array(20));
  const letters = [...random].map((byte) => LETTERS[byte % LETTERS.length]).join('');
  return letters.replace(/(.{5})(?=.)/g, '$1-');
}
