/** Class I and II substances that are used as refrigerants, 42 USC 7671a(a) and (b). Not R-1233zd(E), which is listed in neither. */
const OZONE_DEPLETING: ReadonlySet<string> = new Set([
  ...['R-11', 'R-12', 'R-13', 'R-13B1', 'R-113', 'R-114', 'R-115'],
  ...['R-21', 'R-22', 'R-123', 'R-124', 'R-141b', 'R-142b'],
]);

/** The regulated hydrofluorocarbons of the AIM Act, 42 USC 7675(c). */
const REGULATED_HFCS: ReadonlySet<string> = new Set([
  ...['R-134', 'R-134a', 'R-143', 'R-245fa', 'R-365mfc', 'R-227ea', 'R-236cb', 'R-236ea', 'R-236fa'],
  ...['R-245ca', 'R-43-10mee', 'R-32', 'R-125', 'R-143a', 'R-41', 'R-152', 'R-152a', 'R-23'],
]);

/** Whether a component is a class I or class II ozone-depleting substance, by its designation. */
export const isOzoneDepleting = (designation: string): boolean => OZONE_DEPLETING.has(designation);

/** Whether a component is a regulated hydrofluorocarbon, by its designation. */
export const isHfc = (designation: string): boolean => REGULATED_HFCS.has(designation);
