import { doublePrecision, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';

/**
 * How sure a figure of the catalogue is: `read` from the named source, `computed` from read figures or a reference
 * equation of state, `memory` recalled and still to be verified.
 */
export const FIGURE_MARKS = ['read', 'computed', 'memory'] as const;
const mark = (name: string) => text(name, { enum: FIGURE_MARKS }).notNull();

/** The refrigerants of the trade by standard designation. Reference data: the same for every company, written by migration. */
export const refrigerants = pgTable('refrigerants', {
  designation: text('designation').primaryKey(),
  type: text('type').notNull(),
  /** ASHRAE 34 safety class. */
  safetyClass: text('safety_class').notNull(),
  safetyClassSource: text('safety_class_source').notNull(),
  safetyClassMark: mark('safety_class_mark'),
  /** 100-year GWP with IPCC AR4 component values, kg CO2e per kg. */
  gwpAr4: doublePrecision('gwp_ar4').notNull(),
  gwpSource: text('gwp_source').notNull(),
  gwpMark: mark('gwp_mark'),
  gwpAr6: doublePrecision('gwp_ar6'),
  /** Ozone depletion potential against R-11, statute values. */
  odp: doublePrecision('odp').notNull(),
  odpSource: text('odp_source').notNull(),
  odpMark: mark('odp_mark'),
  /** Saturated liquid density at 25 °C, kg/m3; NULL above the critical temperature. */
  liquidDensityKgPerM3: doublePrecision('liquid_density_kg_per_m3'),
  /** Saturated (bubble) pressure at 104 °F, psia; NULL above the critical temperature. */
  pressureAt104FPsia: doublePrecision('pressure_at_104_f_psia'),
  /** Pressure class of 40 CFR 82.152. */
  pressureClass: text('pressure_class', { enum: ['low', 'medium', 'high', 'very_high'] }).notNull(),
  densitySource: text('density_source').notNull(),
  densityMark: mark('density_mark'),
  compositionSource: text('composition_source').notNull(),
  compositionMark: mark('composition_mark'),
});

/** What a blend is made of, in mass per cent; a pure fluid has one row of 100. */
export const refrigerantComponents = pgTable(
  'refrigerant_components',
  {
    designation: text('designation')
      .notNull()
      .references(() => refrigerants.designation, { onDelete: 'cascade' }),
    component: text('component').notNull(),
    massPercent: doublePrecision('mass_percent').notNull(),
    tolerance: text('tolerance'),
  },
  (t) => [primaryKey({ columns: [t.designation, t.component] })],
);
