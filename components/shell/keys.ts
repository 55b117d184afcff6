/** What a key does, by the place where it does it. */
type KeyPlace = { place: string; keys: readonly (readonly [keys: string, does: string])[] };

/** Keys that belong to a place; those that lead to screens follow from the screens. */
export const KEYS_BY_PLACE: readonly KeyPlace[] = [
  {
    place: 'In a chart',
    keys: [
      ['← →', 'one mark back or on'],
      ['Page Up, Page Down', 'a leap back or on: a year of months'],
      ['Home, End', 'the first or the last mark'],
      ['Enter', 'open the records of the mark'],
      ['Esc', 'leave the mark'],
    ],
  },
  {
    place: 'In a table',
    keys: [
      ['Tab', 'to the next heading or figure'],
      ['Enter on a heading', 'sort by it; again turns it round'],
      ['← → on the table', 'move it sideways where it is too wide'],
      ['Enter on a figure', 'what it is made of'],
    ],
  },
  {
    place: 'Among flags',
    keys: [
      ['j k', 'the next record or the one before'],
      ['d', 'decide what it was'],
      ['1 to 6', 'while deciding: that decision'],
      ['Esc', 'leave it open'],
    ],
  },
  {
    place: 'In the sentence over a screen',
    keys: [
      ['Enter', 'set this part'],
      ['↑ ↓, Enter', 'go through the choices and take one'],
      ['Esc', 'leave it as it was'],
    ],
  },
  {
    place: 'In an opened figure or a meaning',
    keys: [['Esc', 'close it; the keyboard is back where it was']],
  },
];
