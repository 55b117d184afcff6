import { idOf } from '@/lib/api/id-of';
import { json, jsonBody, withViewer } from '@/lib/api/route';
import { stateSubsector, subsectorBody } from '@/lib/charge-additions/settings';

type Context = RouteContext<'/api/appliances/[id]/subsector'>;

/** Says whether an appliance is of the residential and light commercial subsector: { lightCommercial }. */
export const PUT = withViewer('leaks:write', async (request, viewer, context: Context) => {
  const id = await idOf(context, 'This appliance');
  const { lightCommercial } = await jsonBody(request, subsectorBody);
  await stateSubsector(viewer, id, lightCommercial);
  return json({ id, lightCommercial });
});
