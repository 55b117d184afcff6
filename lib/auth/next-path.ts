const ANY_ORIGIN = 'http://same-site.invalid';

/** Where to go after signing in: `next` when it is a path of this site, otherwise the start. */
export const safeNextPath = (next: string | null | undefined): string => {
  if (!next?.startsWith('/') || !URL.canParse(next, ANY_ORIGIN)) return '/';
  const url = new URL(next, ANY_ORIGIN);
  return url.origin === ANY_ORIGIN ? `${url.pathname}${url.search}${url.hash}` : '/';
};
