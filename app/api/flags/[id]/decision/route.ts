import { jsonBody, withViewer } from '@/lib/api/route';
import { decisionBody } from '@/lib/flags/body';
import { decideFlag } from '@/lib/flags/decide';
import { flagAnswer, flagIdOf } from '../flag-answer';

type Context = RouteContext<'/api/flags/[id]/decision'>;

/** Decides a flag: { decision, note, wholeRecord }. */
export const POST = withViewer('flags:decide', async (request, viewer, context: Context) => {
  const id = await flagIdOf(context);
  await decideFlag(viewer, id, await jsonBody(request, decisionBody));
  return flagAnswer(viewer, id);
});
