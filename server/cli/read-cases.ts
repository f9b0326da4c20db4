import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';

/** Why no case could be read at all; its message is one line for standard error. */
export class UnreadableInput extends Error {}

/**
 * The cases of a file, or of standard input for `-`: one case or an array of them, not yet checked.
 * A relative path counts from the folder the command was typed in.
 * @throws {UnreadableInput} when the file is missing, is empty or is not JSON of that form
 */
export function readCases(source: string | undefined): readonly unknown[] {
  if (source === undefined) {
    throw new UnreadableInput('Name a JSON file of cases, or - to read standard input.');
  }
  const name = source === '-' ? 'standard input' : source;
  const text = readText(source, name).replace(/^\uFEFF/, '');
  if (text.trim() === '')
    throw new UnreadableInput(`${name} is empty; one case or an array of cases is expected.`);
  const value = parse(text, name);
  if (typeof value !== 'object' || value === null) {
    throw new UnreadableInput(`${name} holds neither a case (an object) nor an array of cases.`);
  }
  return Array.isArray(value) ? value : [value];
}

function readText(source: string, name: string): string {
  try {
    return source === '-'
      ? readFileSync(0, 'utf8')
      : readFileSync(resolve(process.env.INIT_CWD ?? process.cwd(), source), 'utf8');
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    // A closed standard input reads as an error on some systems; it holds nothing.
    if (source === '-' && code === 'EOF') return '';
    const reason =
      code === 'ENOENT' ? 'there is no such file' : `it cannot be read (${code ?? 'unknown error'})`;
    throw new UnreadableInput(`${name}: ${reason}.`);
  }
}

function parse(text: string, name: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    const reason = (error as Error).message.replace(/\s+/g, ' ').slice(0, 160);
    throw new UnreadableInput(`${name} is not JSON: ${reason}`);
  }
}
