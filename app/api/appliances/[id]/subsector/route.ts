import { placeIdOf } from '@/app/api/place-id';
import { json, jsonBody, withViewer } from '@/lib/api/route';
import { stateSubsector, subsectorBody } from '@/lib/charge-additions/settings';

type Context = RouteContext<'/api/appliances/[id]/subsector'>;

/** Says whether an appliance is of the residential and light commercial subsector: { lightCommercial }. */
export const PUT = withViewer('leaks:write', async (request, viewer, { params }: Context) => {
  const id = await placeIdOf(params, 'This appliance');
  const { lightCommercial } = await jsonBody(request, subsectorBody);
  await stateSubsector(viewer, id, lightCommercial);
  return json({ id, lightCommercial });
});
