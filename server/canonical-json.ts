type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };

/**
 * JSON in one form only: keys sorted by code unit, no spaces; undefined members left out. The same value gives the
 * same bytes, so that a hash can be taken over it.
 * @throws {TypeError} for what JSON cannot say (NaN, Infinity, functions)
 */
export function canonicalJson(value: unknown): string {
  return write(value as Json);
}

function write(value: Json): string {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new TypeError(`JSON has no ${value}.`);
  }
  if (value === null || typeof value !== 'object') {
    const text = JSON.stringify(value) as string | undefined;
    if (text === undefined) throw new TypeError(`JSON has no ${typeof value}.`);
    return text;
  }
  if (Array.isArray(value)) return `[${value.map(write).join(',')}]`;
  const members = value as { readonly [key: string]: Json };
  const names = Object.keys(members)
    .filter((name) => members[name] !== undefined)
    .sort();
  return `{${names.map((name) => `${JSON.stringify(name)}:${write(members[name] as Json)}`).join(',')}}`;
}
