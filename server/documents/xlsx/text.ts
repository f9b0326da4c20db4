/** What XML 1.0 cannot hold. */
// eslint-disable-next-line no-control-regex
const UNPRINTABLE =
  /[\u0000-\u0008\u000B\u000C\u000E-\u001F\uFFFE\uFFFF]|[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/g;
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
