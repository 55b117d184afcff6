import { withViewer } from '@/lib/api/route';
import { reopenFlag } from '@/lib/flags/reopen';
import { flagAnswer, flagIdOf } from '../flag-answer';

type Context = RouteContext<'/api/flags/[id]/reopen'>;

/** Takes a decision back, with everything that followed from it. */
export const POST = withViewer('flags:decide', async (_request, viewer, context: Context) => {
  const id = await flagIdOf(context);
  await reopenFlag(viewer, id);
  return flagAnswer(viewer, id);
});
