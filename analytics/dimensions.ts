/** The dimensions by which figures can be split and scopes narrowed. No imports: the browser reads this too. */
export const DIMENSIONS = ['refrigerant', 'technician', 'site', 'branch', 'category', 'jobType'] as const;
export type Dimension = (typeof DIMENSIONS)[number];

/** How a record that does not state a dimension is named in keys and in the address. */
export const UNSTATED = 'unstated';
