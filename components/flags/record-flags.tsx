'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { byRecord } from '@/analytics/flags/by-record';
import { useRecordFlags } from '@/analytics/flags/hook';
import { Sheet } from '@/components/ui/sheet';
import { useViewer } from '@/components/viewer-context';
import { FlagItem, type FlagTask } from './flag-item';

/** The flags of one record, to be decided where the record is read; nothing while it has none. */
export const RecordFlags = ({ recoveryId }: { recoveryId: string }) => {
  const { massUnit } = useViewer();
  const { data } = useRecordFlags(recoveryId, massUnit);
  const [task, setTask] = useState<FlagTask>(null);
  // The page around is the server's: a decision may have left the record out of the figures.
  const router = useRouter();
  const records = byRecord(data?.items ?? []);
  if (records.length === 0) return null;
  return (
    <Sheet title="Flags" aside="A reason to look, not a finding">
      <ol>
        {records.map((record) => (
          <FlagItem
            key={record.lead.id}
            record={record}
            unit={massUnit}
            task={record.lead.state === 'open' ? task : null}
            facts={false}
            onTask={setTask}
            onDecided={() => {
              setTask(null);
              router.refresh();
            }}
            onReopened={() => router.refresh()}
          />
        ))}
      </ol>
    </Sheet>
  );
};
