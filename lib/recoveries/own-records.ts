import 'server-only';
import { eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { technicians } from '@/db/schema/places';
import type { Viewer } from '@/lib/auth/viewer';
import { AppError, badInput } from '@/lib/errors';
import type { RecordTexts } from './fields';

/**
 * The name under which this viewer writes records: his own for a technician, null for who may write anybody's. Throws
 * 403 for a technician's account that no technician was linked to.
 */
export const ownTechnician = async (tx: Tx, viewer: Viewer): Promise<string | null> => {
  if (viewer.role !== 'technician') return null;
  const [own] = viewer.technicianId
    ? await tx.select({ name: technicians.name }).from(technicians).where(eq(technicians.id, viewer.technicianId))
    : [];
  if (!own)
    throw new AppError(
      403,
      'Not linked yet',
      'Your account is not linked to a technician yet. Ask the office to link it.',
    );
  return own.name;
};

/** The texts with the writer's own name filled in; throws 400 when a technician names somebody else. */
export const withOwnTechnician = (texts: RecordTexts, own: string | null): RecordTexts => {
  if (own === null) return texts;
  if (texts.technician !== '' && texts.technician.toLowerCase() !== own.toLowerCase())
    throw badInput([{ path: 'technician', message: `You write your own records: the technician is ${own}` }]);
  return { ...texts, technician: own };
};
