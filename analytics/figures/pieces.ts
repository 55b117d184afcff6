import type { Measure } from './measures';

/** A piece of a sentence: text, or a figure over the sentence's scope that opens. */
export type Piece = string | { measure: Measure; figure: string };

/** The sentence without its links. */
export const piecesText = (pieces: readonly Piece[]): string =>
  pieces.map((piece) => (typeof piece === 'string' ? piece : piece.figure)).join('');
