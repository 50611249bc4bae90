import type { Catalogue, CatalogueFunction } from "../../catalogue/catalogue";
import { SYNONYMS } from "./synonyms";

/** What a function says about itself, from the words that name it best down to those that only mention it. */
interface Entry {
  readonly found: CatalogueFunction;
  readonly fields: readonly { readonly text: string; readonly weight: number }[];
}

/** One thing looked for: a word or a phrase, and what else it is called. */
interface Term {
  readonly own: string;
  readonly others: readonly string[];
}

const SMALL_WORDS = new Set(
  "a an and at by for from how i in into is it my of on or the to turn want what with".split(" "),
);

/** Words as they are compared: lower case, without accents and marks, a space on either side. */
const plain = (text: string): string =>
  ` ${text
    .toLowerCase()
    .normalize("NFKD")
    .replace(/[^\p{L}\p{N}µ]+/gu, " ")
    .trim()} `;

/** Finds functions by name, by job and by words of the trade; the best first. */
export function searcher(catalogue: Catalogue): (query: string) => CatalogueFunction[] {
  const entries = catalogue.functions.map((found) => entryOf(catalogue, found));
  return (query) => {
    const terms = termsOf(query);
    if (terms.length === 0) return [];
    const scored = entries.map((entry) => ({ entry, scores: terms.map((term) => score(entry, term)) }));
    const all = scored.filter(({ scores }) => scores.every((each) => each > 0));
    // Rather something near than nothing: where no function has it all, those that have most of it.
    const near = scored.filter(
      ({ scores }) =>
        scores.filter((each) => each > 0).length * 2 >= scores.length && scores.some((each) => each > 0),
    );
    return (all.length > 0 ? all : near)
      .map(({ entry, scores }) => ({ entry, sum: scores.reduce((sum, each) => sum + each, 0) }))
      .sort((a, b) => b.sum - a.sum)
      .map(({ entry }) => entry.found);
  };
}

function entryOf({ categories }: Catalogue, found: CatalogueFunction): Entry {
  const family = categories.find(({ name }) => name === found.category);
  return {
    found,
    fields: [
      { text: plain(found.id), weight: 10 },
      ...found.keywords.map((keyword, index) => ({ text: plain(keyword), weight: 6 - index * 0.05 })),
      { text: plain(found.description), weight: 3 },
      { text: plain(`${found.result} ${found.standards.join(" ")}`), weight: 1.5 },
      { text: plain(found.parameters.map(({ name, kind }) => `${name} ${kind}`).join(" ")), weight: 1 },
      { text: plain(`${found.category} ${family?.sentence ?? ""}`), weight: 0.5 },
    ],
  };
}

/** The longest known phrases first, then the words that are left. */
function termsOf(query: string): Term[] {
  const terms: Term[] = [];
  let rest = plain(query);
  const known = SYNONYMS.flatMap((group) => group.map((phrase) => ({ phrase: plain(phrase), group })));
  known.sort((a, b) => b.phrase.length - a.phrase.length);
  for (const { phrase, group } of known) {
    if (!rest.includes(phrase)) continue;
    rest = rest.replace(phrase, " ");
    terms.push({ own: phrase.trim(), others: group.map((each) => plain(each).trim()) });
  }
  for (const word of rest.trim().split(" ")) {
    if (word !== "" && !SMALL_WORDS.has(word)) terms.push({ own: word, others: [] });
  }
  return terms;
}

function score({ fields }: Entry, { own, others }: Term): number {
  let best = 0;
  for (const { text, weight } of fields) {
    best = Math.max(best, weight * match(text, own));
    for (const each of others) best = Math.max(best, 0.5 * weight * match(text, each));
  }
  return best;
}

/** A whole field counts more than a whole word in it, and that more than the start of a word. */
function match(text: string, phrase: string): number {
  if (text === ` ${phrase} `) return 2;
  if (text.includes(` ${phrase} `)) return 1;
  // A single letter is the start of too many words.
  return phrase.length > 1 && text.includes(` ${phrase}`) ? 0.8 : 0;
}
