import { PUBLISHED_ROUTES } from '@/analytics/published-routes';
import { openApiDocument } from '@/lib/api/openapi';
import packageJson from '@/package.json';

/** The shape of the API as OpenAPI 3.1; the same for everybody, and no company's data. */
export const GET = (): Response => Response.json(openApiDocument(PUBLISHED_ROUTES, packageJson.version));
