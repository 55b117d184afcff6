import { scopeOptions } from '@/analytics/scope-options/contract';
import { getScopeOptions } from '@/analytics/scope-options/query';
import { withCompany } from '@/db/client';
import { getKeptRoute } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';

export const GET = getKeptRoute(scopeOptions, (_query, viewer) => withCompany(scopeOf(viewer), getScopeOptions));
