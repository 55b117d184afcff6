import type { Metadata } from 'next';
import { RecordForm } from '@/components/records/record-form';
import { NotForRole } from '@/components/ui/not-for-role';
import { PageHead } from '@/components/ui/page-head';
import { Empty } from '@/components/ui/states';
import { withCompany } from '@/db/client';
import { viewerFor } from '@/lib/auth/current-viewer';
import { scopeOf } from '@/lib/auth/viewer';
import { AppError } from '@/lib/errors';
import { emptyTexts } from '@/lib/recoveries/fields';
import { todayIn } from '@/lib/recoveries/local-time';
import { ownTechnician } from '@/lib/recoveries/own-records';

export const metadata: Metadata = { title: 'New record' };

export default async function NewRecordPage() {
  const { viewer, allowed } = await viewerFor('records:write');
  if (!allowed) return <NotForRole screen="Writing records" role={viewer.role} />;
  const own = await withCompany(scopeOf(viewer), (tx) => ownTechnician(tx, viewer)).catch((error: unknown) => {
    if (error instanceof AppError) return error;
    throw error;
  });
  if (own instanceof AppError) return <Empty title={own.title}>{own.message}</Empty>;
  const empty = emptyTexts({ recoveredAt: todayIn(viewer.timeZone), massUnit: viewer.massUnit, vacuumUnit: 'inhg' });
  return (
    <>
      <PageHead
        className="mb-5"
        title="Write down one recovery"
        sub="Ref, day, technician, site, appliance, refrigerant, nameplate and weights are needed; what is not known may stay empty."
      />
      <RecordForm empty={empty} ownName={own ?? undefined} />
    </>
  );
}
