import { type NextRequest, NextResponse } from 'next/server';

/**
 * Gives every page a content security policy with a nonce of its own and tells it its address. It guards nothing: each
 * page and handler asks for its viewer itself.
 */
export const proxy = (request: NextRequest): NextResponse => {
  const nonce = Buffer.from(crypto.randomUUID()).toString('base64');
  // React's error overlays need eval while developing, and only then.
  const development = process.env.NODE_ENV === 'development';
  const policy = [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    // Charts and popovers place themselves with style attributes.
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('x-path', request.nextUrl.pathname + request.nextUrl.search);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  return response;
};

export const config = { matcher: ['/((?!api/|_next/static|_next/image|favicon.ico|fonts/).*)'] };
