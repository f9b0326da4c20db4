import { functions, keywords, type NameInfo } from '@shared/expressions/index.ts';

/** Something that can be written at the caret. */
export interface Offer {
  /** What is written. */
  readonly text: string;
  readonly title: string;
  readonly help: string;
}
export interface Completion {
  /** The characters that the offer takes the place of. */
  readonly from: number;
  readonly to: number;
  readonly offers: readonly Offer[];
}

/** Offers shown while typing; asked for by hand, all are. */
const MOST = 8;

const nameOffer = ({ name, label, unit }: NameInfo): Offer => ({
  text: name,
  title: name,
  help: `${label}${unit && `, ${unit}`}`,
});
const functionOffers: readonly Offer[] = functions.map(({ name, form, meaning }) => ({
  text: `${name}(`,
  title: form,
  help: meaning,
}));
const wordOffer = (word: string, { label }: NameInfo): Offer => ({
  text: `${word}"`,
  title: `"${word}"`,
  help: label,
});

/**
 * What may be written at the caret: words inside a quote after a name, else names and functions. Null where nothing
 * fits, or what fits stands there already.
 * @param asked whether the person asked for it, and so gets the whole list before a letter is typed
 */
export function completionAt(
  text: string,
  caret: number,
  names: readonly NameInfo[],
  asked: boolean,
): Completion | null {
  const before = text.slice(0, caret);
  const quoted = /([A-Za-z_]\w*)\s*(?:=|<>)\s*"([^"]*)$/.exec(before);
  if (quoted) return wordsAt(text, caret, quoted[1] ?? '', quoted[2] ?? '', names);
  const typed = /[A-Za-z_]\w*$/.exec(before)?.[0] ?? '';
  // Inside a quote without a name, or a number such as 1e3, nothing is offered.
  if ((before.match(/"/g)?.length ?? 0) % 2 === 1 || /\d$/.test(before.slice(0, caret - typed.length)))
    return null;
  if (typed === '' && !asked) return null;
  const rest = /^\w*/.exec(text.slice(caret))?.[0] ?? '';
  const all = [...names.filter(({ unused }) => unused === undefined).map(nameOffer), ...functionOffers];
  const offers = ranked(all, typed);
  const done = offers[0]?.text === typed + rest;
  if (offers.length === 0 || (done && !asked) || isKeyword(typed)) return null;
  return {
    from: caret - typed.length,
    to: caret + rest.length,
    offers: asked ? offers : offers.slice(0, MOST),
  };
}

const isKeyword = (typed: string): boolean => (keywords as readonly string[]).includes(typed);

function wordsAt(
  text: string,
  caret: number,
  name: string,
  typed: string,
  names: readonly NameInfo[],
): Completion | null {
  const info = names.find((one) => one.name === name);
  const words = (info?.words ?? []).filter((word) => word.toLowerCase().startsWith(typed.toLowerCase()));
  if (!info || words.length === 0) return null;
  const rest = /^[^"]*"/.exec(text.slice(caret))?.[0] ?? '';
  const offers = words.slice(0, MOST).map((word) => wordOffer(word, info));
  return { from: caret - typed.length, to: caret + rest.length, offers };
}

/** Those that begin with what is typed, then those that have it anywhere, then those whose meaning has it. */
function ranked(offers: readonly Offer[], typed: string): Offer[] {
  const wanted = typed.toLowerCase();
  const rank = ({ text, help }: Offer): number => {
    if (text.toLowerCase().startsWith(wanted)) return 0;
    if (text.toLowerCase().includes(wanted)) return 1;
    return wanted.length > 2 && help.toLowerCase().includes(wanted) ? 2 : 3;
  };
  return [0, 1, 2].flatMap((wantedRank) => offers.filter((offer) => rank(offer) === wantedRank));
}

/** The text with an offer written into it, and where the caret stands after it. */
export function written(
  text: string,
  { from, to }: Completion,
  offer: Offer,
): { text: string; caret: number } {
  const caret = from + offer.text.length;
  return { text: text.slice(0, from) + offer.text + text.slice(to), caret };
}
