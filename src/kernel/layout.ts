/**
 * Where things stand in the kernel's memory: a header of 32-bit fields at a fixed address. Both the
 * WebAssembly functions and their TypeScript twins import this file, so it holds plain constants only.
 * Addresses are in bytes; `*_AT` are addresses of fields.
 */

/** Bytes before the first region. */
export const HEADER_BYTES = 4096;
/** The multiplier of a multiple that is being placed, up to the end of the header. */
export const MULTIPLIER_AT = 1024;

/** Bytes of one packed monomial, a multiple of 16. */
export const MONOMIAL_BYTES_AT = 64;
/** 1 when exponents take 16 bits, 0 when they take 8. */
export const WIDE_AT = 68;
/** 1 when the support mask holds two bits a variable (at most 16 variables). */
export const TWO_BIT_MASKS_AT = 72;

/* The columns of the matrix at hand, in the order in which they were met. */
export const COLUMN_COUNT_AT = 80;
export const COLUMN_CAPACITY_AT = 84;
export const COLUMN_EXPONENTS_AT = 88;
export const COLUMN_MASKS_AT = 92;
export const COLUMN_HASHES_AT = 96;
/** For each column the row that reduces it, or −1. */
export const COLUMN_PIVOTS_AT = 100;
/** Open addressing: hash in the low word, 1 + column in the high word. */
export const SLOTS_AT = 104;
/** Number of slots minus 1; a power of two minus 1. */
export const SLOT_MASK_AT = 108;

/* The leading monomials that reduce. */
export const LEAD_COUNT_AT = 112;
/** The number of each among the monomials. */
export const LEAD_MONOMIALS_AT = 116;
/** Padded with ones to a multiple of four. */
export const LEAD_MASKS_AT = 120;
export const LEAD_ELEMENTS_AT = 124;

/* The monomials of the basis elements, by their number in the monomial table. */
export const MONOMIAL_EXPONENTS_AT = 132;
export const MONOMIAL_HASHES_AT = 136;
export const HASH_WEIGHTS_AT = 140;

/** Per element four words: address of its monomials, length, address of its coefficients, unused. */
export const ELEMENTS_AT = 144;

/* The rows of the matrix: per row four words, element, length, address of columns, of coefficients. */
export const ROW_COUNT_AT = 148;
export const ROW_CAPACITY_AT = 152;
export const ROWS_AT = 156;

/** The next free byte for columns of rows, and the end of that region. */
export const HEAP_AT = 160;
export const HEAP_END_AT = 164;
/** The next column that a reducer is sought for. */
export const PROGRESS_AT = 168;

/* What a function that may stop early returns. */
export const DONE = 0;
export const OUT_OF_FUEL = 1;
export const OUT_OF_SPACE = 2;
export const EXPONENT_TOO_LARGE = 3;
