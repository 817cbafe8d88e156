import type { en } from './en';

/** Plural forms stand as `key_one` and `key_other`; they are asked for as `key`. */
type WithoutPlural<Key extends string> = Key extends `${infer Base}_one`
  ? Base
  : Key extends `${infer Base}_other`
    ? Base
    : Key;

type KeysOf<Words> = {
  [Key in keyof Words & string]: Words[Key] extends string
    ? WithoutPlural<Key>
    : `${Key}.${KeysOf<Words[Key]>}`;
}[keyof Words & string];

/** "area.key", "area.group.key": a word that is not there does not compile. */
export type WordKey = KeysOf<typeof en>;
