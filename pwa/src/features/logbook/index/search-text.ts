/** Marks that are taken off letters, so that "Skovtop" finds "Skovtóp". */
const MARKS = /\p{M}/gu;
const NOT_IN_WORDS = /[^\p{L}\p{N}]+/u;
const IN_WORD = /[\p{L}\p{N}]/u;

/** Text as it is compared in a search: lower case, without accents. */
export function folded(text: string): string {
  return text.normalize('NFD').replace(MARKS, '').toLowerCase();
}

/** The beginnings of words that a search asks for; all of them have to be found. */
export function searchWords(text: string): string[] {
  return folded(text).split(NOT_IN_WORDS).filter(Boolean);
}

/** True where a word of `foldedText` begins with `word`; both folded. */
export function hasWord(foldedText: string, word: string): boolean {
  let at = foldedText.indexOf(word);
  while (at !== -1) {
    if (at === 0 || !IN_WORD.test(foldedText[at - 1]!)) return true;
    at = foldedText.indexOf(word, at + 1);
  }
  return false;
}
