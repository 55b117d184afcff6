/** One fault in what was sent: where it is and what would be right. */
export type FieldError = { path: string; message: string };

/** An error that the caller may read: the API turns it into problem+json with this status. */
export class AppError extends Error {
  constructor(
    readonly status: number,
    readonly title: string,
    detail: string,
    readonly errors: FieldError[] = [],
    options?: ErrorOptions & { retryAfterSeconds?: number },
  ) {
    super(detail, options);
    this.retryAfterSeconds = options?.retryAfterSeconds;
  }
  readonly retryAfterSeconds: number | undefined;
}

export const badInput = (errors: FieldError[]) =>
  new AppError(
    400,
    'Bad input',
    errors.map((e) => (e.path ? `${e.path}: ${e.message}` : e.message)).join('; '),
    errors,
  );
export const unauthorized = () =>
  new AppError(401, 'Sign in first', 'No valid session or access token came with the request.');
export const forbidden = () =>
  new AppError(403, 'Not for this role', 'Your role in this company does not include this.');
/** Also for what belongs to another company: the two look the same. */
export const notFound = (what = 'It') => new AppError(404, 'Not found', `${what} is not here.`);
export const conflict = (detail: string) => new AppError(409, 'Changed meanwhile', detail);
export const tooLarge = (detail: string) => new AppError(413, 'Too large', detail);
export const unreadable = (detail: string, errors: FieldError[] = []) =>
  new AppError(422, 'The file can’t be read', detail, errors);
export const tooMany = (retryAfterSeconds: number) =>
  new AppError(429, 'Too many tries', `Wait ${retryAfterSeconds} seconds, then try again.`, [], { retryAfterSeconds });
