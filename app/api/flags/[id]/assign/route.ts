import { jsonBody, withViewer } from '@/lib/api/route';
import { assignFlag } from '@/lib/flags/assign';
import { assignmentBody } from '@/lib/flags/body';
import { flagAnswer, flagIdOf } from '../flag-answer';

type Context = RouteContext<'/api/flags/[id]/assign'>;

/** Asks somebody to look, or notes what he ought to know: { assignedTo, note }. */
export const POST = withViewer('flags:decide', async (request, viewer, context: Context) => {
  const id = await flagIdOf(context);
  await assignFlag(viewer, id, await jsonBody(request, assignmentBody));
  return flagAnswer(viewer, id);
});
