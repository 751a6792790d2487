/** The words of texts as they are compared: letters and digits only, small, without accents. */
export const foldedWords = (...texts: string[]): string[] => texts.flatMap((text) => fold(text).match(WORD) ?? []);

/** Texts to be searched in: each word after a space, so that a word's beginning is found by ` word`. */
export const searchText = (...texts: string[]): string => foldedWords(...texts).map((word) => ` ${word}`).join('');

const WORD = /[\p{L}\p{N}]+/gu;
const fold = (text: string): string => text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase();
