import { sql } from 'drizzle-orm';
import type { NodePgDatabase } from 'drizzle-orm/node-postgres';
import { refrigerantComponents, refrigerants } from '@/db/schema/refrigerants';
import { COMPONENTS } from './components';
import { CATALOGUE, type CatalogueEntry } from './refrigerants';

const componentOf = (name: string) => {
  const found = COMPONENTS[name];
  if (!found) throw new Error(`The catalogue names ${name} as a component but has no GWP and ODP for it.`);
  return found;
};

/** Mass-weighted sum over the components, 40 CFR 84.64: the GWP (or ODP) of a blend. */
export const blendFigure = (entry: CatalogueEntry, figure: 'gwpAr4' | 'odp'): number =>
  entry.components.reduce((sum, [name, massPercent]) => sum + (massPercent / 100) * componentOf(name)[figure], 0);

const markOf = (entry: CatalogueEntry, mark: 'gwpMark' | 'odpMark') => {
  if (entry.components.some(([name]) => componentOf(name)[mark] === 'memory')) return 'memory' as const;
  return entry.components.length > 1 ? ('computed' as const) : ('read' as const);
};

const rowOf = (entry: CatalogueEntry): typeof refrigerants.$inferInsert => ({
  designation: entry.designation,
  type: entry.type,
  safetyClass: entry.safetyClass,
  safetyClassSource: 'ANSI/ASHRAE Standard 34',
  safetyClassMark: entry.classMark,
  gwpAr4: blendFigure(entry, 'gwpAr4'),
  gwpSource: '42 USC 7675(c), 40 CFR 98 Table A-1 (IPCC AR4); blends: mass-weighted, 40 CFR 84.64',
  gwpMark: markOf(entry, 'gwpMark'),
  gwpAr6: entry.gwpAr6 ?? null,
  odp: blendFigure(entry, 'odp'),
  odpSource: '42 USC 7671a(e); blends: mass-weighted',
  odpMark: markOf(entry, 'odpMark'),
  liquidDensityKgPerM3: entry.liquidDensityKgPerM3 ?? null,
  pressureAt104FPsia: entry.pressureAt104FPsia ?? null,
  pressureClass: entry.pressureClass,
  densitySource: entry.roughModel ? 'CoolProp 8.0.0, simple mixing rule' : 'CoolProp 8.0.0',
  densityMark: 'computed',
  compositionSource: 'ANSI/ASHRAE Standard 34',
  compositionMark: entry.compositionMark ?? 'read',
});

/** Writes the catalogue into its tables, replacing what an older version of the code said. */
export const writeRefrigerantCatalogue = (db: NodePgDatabase): Promise<void> =>
  db.transaction(async (tx) => {
    for (const entry of CATALOGUE) {
      const row = rowOf(entry);
      await tx.insert(refrigerants).values(row).onConflictDoUpdate({ target: refrigerants.designation, set: row });
    }
    const parts = CATALOGUE.flatMap(({ designation, components }) =>
      components.map(([component, massPercent, tolerance]) => ({
        designation,
        component,
        massPercent,
        tolerance: tolerance ?? null,
      })),
    );
    await tx.delete(refrigerantComponents).where(sql`true`);
    await tx.insert(refrigerantComponents).values(parts);
  });
