import type { ChartNote } from './layer';

/** A note as it is drawn: cut to the months in the picture, in a lane in which it meets no other. */
export type PlacedNote = ChartNote & { lane: number };

/** Puts each note that touches the picture's months into the first lane that is free there, in order of their beginning. */
export const placeNotes = (notes: readonly ChartNote[], months: readonly string[]): PlacedNote[] => {
  const lastOfLane: string[] = [];
  return notes
    .flatMap((note) => {
      const touched = months.filter((month) => note.first <= month && month <= note.last);
      const [first, last] = [touched[0], touched.at(-1)];
      return first && last ? [{ ...note, first, last }] : [];
    })
    .sort((a, b) => a.first.localeCompare(b.first) || a.no - b.no)
    .map((note) => {
      const free = lastOfLane.findIndex((last) => last < note.first);
      const lane = free < 0 ? lastOfLane.length : free;
      lastOfLane[lane] = note.last;
      return { ...note, lane };
    });
};
