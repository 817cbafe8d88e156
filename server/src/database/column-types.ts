/** Column types that several tables share. */
export const ID = 'CHAR(36) CHARACTER SET ascii COLLATE ascii_bin';
export const HASH = 'CHAR(64) CHARACTER SET ascii COLLATE ascii_bin';
/** Milliseconds; plain DATETIME would drop them. */
export const TIME = 'DATETIME(3)';
/** Tags and numbers of the shop compare exactly: "f-1" is not "F-1", and spaces count. */
export const exactText = (length: number) =>
  `VARCHAR(${length}) CHARACTER SET utf8mb4 COLLATE utf8mb4_nopad_bin`;
export const text = (length: number) => `VARCHAR(${length})`;
/** A short word from a fixed list in the contracts. */
export const WORD = 'VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin';
