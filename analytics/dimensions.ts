/** The dimensions by which figures can be split and scopes narrowed. No imports: the browser reads this too. */
export const DIMENSIONS = ['refrigerant', 'technician', 'site', 'branch', 'category', 'jobType'] as const;
export type Dimension = (typeof DIMENSIONS)[number];

/**
 * What a scope can be narrowed by. Appliances too, but nothing is split by them: two sites may both have an "RTU-1", so
 * that an appliance's name says something only beside its site's.
 */
export const SCOPE_PARTS = [...DIMENSIONS, 'appliance'] as const;
export type ScopePart = (typeof SCOPE_PARTS)[number];

/** How a record that does not state a dimension is named in keys and in the address. */
export const UNSTATED = 'unstated';
