import type { MassUnit } from '@/lib/vocabulary';
import { DateEvidence } from './date-evidence';
import { isDateField, isMassField, isNumberField, isPressureField } from './field-kinds';
import type { MappedColumn } from './map-columns';
import { parseMassText } from './mass-text';
import { NumberEvidence, type ReadAmount } from './number-evidence';
import { decimalsOf, parseDecimal } from './numbers';
import { parsePressureText } from './pressure-text';
import { isBlankWord } from './text';
import { yearSpanOf } from './year-span';

const EXAMPLES = 3;
const EXAMPLE_LENGTH = 80;
/** A step that fewer readings than this share have is a slip of the pen or the rest of a computation, not the scale's. */
const STEP_SHARE = 0.02;

const readAmount = ({ field }: MappedColumn): ReadAmount => {
  if (isMassField(field)) return (text, mark) => parseMassText(text, mark)?.amount ?? null;
  if (isPressureField(field)) return (text, mark) => parsePressureText(text, mark)?.amount ?? null;
  return parseDecimal;
};

/** What one column of a file holds, gathered in one pass over all of its cells. */
export class ColumnProfile {
  filled = 0;
  /** Filled cells that do not name a unit themselves. */
  withoutUnit = 0;
  readonly examples: string[] = [];
  readonly dates: DateEvidence | null;
  readonly numbers: NumberEvidence | null;
  /** How many readings have how many decimals, by unit; a decimal mark of either kind counts. */
  private readonly decimals = new Map<MassUnit, number[]>();

  constructor(
    readonly column: MappedColumn,
    today: string,
  ) {
    const { field } = column;
    this.dates = isDateField(field) ? new DateEvidence(yearSpanOf(field, today)) : null;
    this.numbers = isNumberField(field) ? new NumberEvidence(readAmount(column)) : null;
  }

  /** Takes one cell; `rowUnit` is the mass unit of its row, where known. */
  add(text: string, rowUnit: MassUnit | null): void {
    if (text === '') return;
    this.filled += 1;
    const example = text.slice(0, EXAMPLE_LENGTH);
    if (this.examples.length < EXAMPLES && !this.examples.includes(example)) this.examples.push(example);
    if (isBlankWord(text)) return;
    this.dates?.add(text);
    this.numbers?.add(text);
    if (isMassField(this.column.field)) this.addMass(text, rowUnit);
    else if (isPressureField(this.column.field) && !parsePressureText(text, 'point')?.unit) this.withoutUnit += 1;
  }

  private addMass(text: string, rowUnit: MassUnit | null): void {
    const mass = parseMassText(text, 'point') ?? parseMassText(text, 'comma');
    if (!mass) return;
    if (!mass.unit) this.withoutUnit += 1;
    const unit = mass.unit ?? rowUnit ?? this.column.meaning?.massUnit;
    if (!unit) return;
    const counts = this.decimals.get(unit) ?? [];
    const decimals = decimalsOf(mass.amount);
    counts[decimals] = (counts[decimals] ?? 0) + 1;
    this.decimals.set(unit, counts);
  }

  /** Decimals to which the column's readings are written, by unit. */
  steps(): Partial<Record<MassUnit, number>> {
    return Object.fromEntries([...this.decimals].map(([unit, counts]) => [unit, finestUsual(counts)]));
  }
}

/** The most decimals that a fair share of the readings has; `counts[d]` readings have d. */
const finestUsual = (counts: readonly (number | undefined)[]): number => {
  const total = counts.reduce<number>((sum, count) => sum + (count ?? 0), 0);
  let finer = 0;
  for (let decimals = counts.length - 1; decimals > 0; decimals -= 1) {
    finer += counts[decimals] ?? 0;
    if (finer >= total * STEP_SHARE) return decimals;
  }
  return 0;
};
