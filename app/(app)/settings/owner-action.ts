import 'server-only';
import type { z } from 'zod';
import { fieldErrors } from '@/lib/api/problem';
import { requireViewer } from '@/lib/auth/current-viewer';
import { may } from '@/lib/auth/permissions';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { AppError, forbidden } from '@/lib/errors';
import { log } from '@/lib/log';
import { type ActionState, UNTOUCHED } from './action-state';

type Owner = { viewer: Viewer; scope: ReturnType<typeof scopeOf> };

const failed = (error: unknown): ActionState => {
  if (!(error instanceof AppError)) {
    log.error({ err: error }, 'settings action failed');
    return { ...UNTOUCHED, error: 'The fault is on our side and has been logged. Nothing was changed.' };
  }
  const fields = Object.fromEntries(error.errors.map(({ path, message }) => [path, message]));
  return { ...UNTOUCHED, fields, error: error.errors.length ? null : error.message };
};

/**
 * The shell of every action of this screen: asks who it is and whether he may, checks the form, and turns refusals into
 * sentences beside the fields.
 */
export const ownerAction =
  <Form extends z.ZodType>(form: Form, act: (input: z.output<Form>, owner: Owner) => Promise<Partial<ActionState>>) =>
  async (_before: ActionState, data: FormData): Promise<ActionState> => {
    const viewer = await requireViewer();
    try {
      if (!may(viewer.role, 'company:manage')) throw forbidden();
      const parsed = form.safeParse(Object.fromEntries(data));
      if (!parsed.success) {
        const fields = Object.fromEntries(fieldErrors(parsed.error).map(({ path, message }) => [path, message]));
        return { ...UNTOUCHED, fields };
      }
      return { ...UNTOUCHED, ...(await act(parsed.data, { viewer, scope: scopeOf(viewer) })) };
    } catch (error) {
      return failed(error);
    }
  };
