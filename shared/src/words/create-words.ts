import { createInstance } from 'i18next';
import { en } from './en';
import type { WordKey } from './word-key';

export type Language = 'en';
export type Say = (key: WordKey, values?: Record<string, string | number>) => string;
export interface Words {
  language: Language;
  say: Say;
}

const RESOURCES = { en: { translation: en } };

/**
 * The words in one language. `say` puts values into their places and picks the plural by `count`.
 *
 * @example createWords('en').say('app.saved', { time: '10:42' }) // "Saved 10:42"
 */
export function createWords(language: Language): Words {
  const words = createInstance();
  void words.init({
    lng: language,
    fallbackLng: false,
    resources: RESOURCES,
    initAsync: false,
    // What is said goes into text nodes, never into markup.
    interpolation: { escapeValue: false },
  });
  return { language, say: (key, values) => words.t(key, { ...values }) };
}
