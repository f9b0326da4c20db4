/** What XML 1.0 cannot hold: control characters, halves of surrogate pairs, non-characters. */
const UNPRINTABLE = /(?![\t\n\r])[\p{Cc}\p{Cs}\uFFFE\uFFFF]/gu;
const LONGEST = 32_000;

/** Text as a cell takes it. It is written as a string cell, so that `=`, `+`, `-` or `@` in front mean nothing. */
export const plainText = (text: string): string => text.replace(UNPRINTABLE, '').slice(0, LONGEST);

/** Text in a page footer, where `&` begins a code. */
export const footerText = (text: string): string => plainText(text).replaceAll('&', '&&').slice(0, 80);

/** A name that a sheet may have, unique by its number. */
export const sheetName = (number: number, text: string): string =>
  `${number} ${plainText(text).replace(/[[\]*?:/\\']/g, '-')}`.slice(0, 31).trim();

/** A file name without what a file system or a header could take wrongly. */
export const fileName = (...parts: readonly string[]): string =>
  `${parts.map((part) => part.replace(/[^A-Za-z0-9.-]+/g, '-')).join('_')}.xlsx`;
