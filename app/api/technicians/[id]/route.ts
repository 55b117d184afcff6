import { technicianPersonQuery, technicianPersonSchema } from '@/analytics/technician-person/contract';
import { getTechnicianPerson } from '@/analytics/technician-person/query';
import { readCompany } from '@/db/client';
import { idOf } from '@/lib/api/id-of';
import { keptJson } from '@/lib/api/kept-response';
import { throwBadInput } from '@/lib/api/problem';
import { searchInput, withViewer } from '@/lib/api/route';
import { notFound } from '@/lib/errors';

const WHAT = 'This technician';

/** One technician against like jobs of colleagues. A technician gets his own; a colleague is not there for him. */
export const GET = withViewer(
  'technician:read',
  async (request, viewer, context: RouteContext<'/api/technicians/[id]'>) => {
    const id = await idOf(context, WHAT);
    if (viewer.role === 'technician' && viewer.technicianId !== id) throw notFound(WHAT);
    const query = technicianPersonQuery.safeParse(searchInput(request.url));
    if (!query.success) return throwBadInput(query.error);
    // The whole crew is read, for a technician too: what leaves is his own row, in which nobody else is named.
    const crew = { companyId: viewer.companyId, actor: viewer.actor };
    return keptJson(request, viewer, `/api/technicians/${id} ${JSON.stringify(query.data)}`, async () => {
      const person = await readCompany(crew, (tx) => getTechnicianPerson(tx, id, query.data, viewer.timeZone));
      if (!person) throw notFound(WHAT);
      return technicianPersonSchema.parse(person);
    });
  },
);
