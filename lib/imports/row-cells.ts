import type { RecoveryField } from './fields';
import type { ColumnLayout, FileLayout } from './layout';
import type { RowReason } from './rows';
import { cleanText, hasLostLetter, isBlankWord } from './text';

/** Columns by the field they hold. */
export type FieldColumns = ReadonlyMap<RecoveryField, ColumnLayout>;

export const fieldColumns = (layout: FileLayout): FieldColumns =>
  new Map(layout.columns.flatMap((column) => (column.field ? [[column.field, column] as const] : [])));

/** One row while it is read: its cells by field, and the reasons against it as they come up. */
export class RowCells {
  readonly reasons: RowReason[] = [];

  constructor(
    private readonly columns: FieldColumns,
    readonly cells: readonly string[],
  ) {}

  column(field: RecoveryField): ColumnLayout | undefined {
    return this.columns.get(field);
  }

  /** The cell as it came; empty when no column holds the field. */
  raw(field: RecoveryField): string {
    const index = this.columns.get(field)?.index;
    return index === undefined ? '' : (this.cells[index] ?? '');
  }

  /** The cell of a number, date or word; empty when it says nothing, be it with a dash or `n/a`. */
  value(field: RecoveryField): string {
    const text = cleanText(this.raw(field));
    return isBlankWord(text) ? '' : text;
  }

  refuse(field: RecoveryField, code: string, message: string): null {
    this.reasons.push({ column: this.columns.get(field)?.header ?? null, code, message, value: this.raw(field) });
    return null;
  }

  /** A name in one spelling, or null when blank; refuses lost letters and what is longer than `longest`. */
  name(field: RecoveryField, longest = 200): string | null {
    const text = cleanText(this.raw(field));
    if (text === '') return null;
    if (hasLostLetter(text))
      return this.refuse(field, 'damaged_text', 'A letter was lost here before the file came; write it again.');
    if (text.length > longest)
      return this.refuse(field, 'too_long', `This is longer than ${longest.toLocaleString('en-US')} characters.`);
    return text;
  }

  /** A name the row must have. */
  neededName(field: RecoveryField, called: string): string | null {
    if (cleanText(this.raw(field)) === '') return this.refuse(field, 'missing', `The ${called} is missing.`);
    return this.name(field);
  }

  /** A word of a closed list, or null when blank; refuses any other. */
  word<Word>(field: RecoveryField, read: (text: string) => Word | null, choices: readonly string[]): Word | null {
    const text = this.value(field);
    if (text === '') return null;
    return (
      read(text) ??
      this.refuse(field, 'unknown_word', `“${text}” is none of ${choices.map((c) => `“${c}”`).join(', ')}.`)
    );
  }
}
