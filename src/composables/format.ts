const whole = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 0 });
const dateTime = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });
const dateOnly = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium' });

/** 1 234 567 with thin spaces, as on a drawing. */
export const count = (value: number): string => whole.format(value).replace(/,/g, '\u202f');

/** Decimals that an increment of rounding has: 0.5 -> 1, 1 -> 0. */
export const decimalsOf = (increment: number): number => /\.(\d+)$/.exec(String(increment))?.[1]?.length ?? 0;

/** A number with a fixed count of decimals and a true minus. */
export const fixed = (value: number, decimals: number): string => {
  const [head = '', tail] = Math.abs(value).toFixed(decimals).split('.');
  const grouped = head.replace(/\B(?=(\d{3})+(?!\d))/g, '\u202f');
  const sign = value < 0 && Number(value.toFixed(decimals)) !== 0 ? '−' : '';
  return `${sign}${grouped}${tail ? `.${tail}` : ''}`;
};

/** At most so many decimals, none for their own sake. */
export const upTo = (value: number, decimals: number): string =>
  fixed(value, decimalsOf(Number(value.toFixed(decimals))));

export const degrees = (value: number): string => `${upTo(value, 2)}°`;

export const instant = (text: string | null): string => (text ? dateTime.format(new Date(text)) : '–');
export const day = (text: string | null): string => (text ? dateOnly.format(new Date(text)) : '–');
