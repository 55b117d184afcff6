'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { HistoryEntry, RecordDetail } from '@/analytics/records/contract';
import { RecordFlags } from '@/components/flags/record-flags';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { useMay, useViewer } from '@/components/viewer-context';
import { plural } from '@/lib/format';
import { CorrectionForm } from './correction-form';
import { LikeJobs } from './like-jobs';
import { RecordFacts } from './record-facts';
import { RecordHistoryList } from './record-history';
import { BackToRecords } from './record-link';
import { RecordSource } from './record-source';
import { RecordTicket } from './record-ticket';
import { recordSentence } from './sentence';

type RecordScreenProps = { record: RecordDetail; history: readonly HistoryEntry[] };

/** One record: what it says in a sentence, its ticket, all fields, where it came from and what became of it. */
export const RecordScreen = ({ record, history }: RecordScreenProps) => {
  const { massUnit } = useViewer();
  const mayWrite = useMay('records:write');
  const mayLook = useMay('flags:read');
  const router = useRouter();
  const queries = useQueryClient();
  const [correcting, setCorrecting] = useState(false);
  const saved = async () => {
    setCorrecting(false);
    router.refresh();
    await queries.invalidateQueries();
  };
  return (
    <>
      <BackToRecords />
      <PageHead
        className="mb-5"
        title={recordSentence(record, massUnit)}
        actions={
          mayWrite && !correcting ? <Button onClick={() => setCorrecting(true)}>Correct this record</Button> : null
        }
      />
      {record.exclusion ? (
        <Notice tone="warning" title="Left out of the figures as an entry error" className="mb-5">
          It still stands in this list and in the export.
        </Notice>
      ) : null}
      <div className="grid items-start gap-5 lg:grid-cols-[22rem_1fr]">
        <RecordTicket record={record} />
        <div className="grid min-w-0 gap-5">
          {correcting ? (
            <Sheet title="Correct this record">
              <CorrectionForm
                key={record.version}
                record={record}
                onSaved={saved}
                onCancel={() => setCorrecting(false)}
              />
            </Sheet>
          ) : (
            <>
              {mayLook ? <RecordFlags recoveryId={record.id} /> : null}
              {record.likeJobs ? (
                <Sheet title="Among like jobs" aside="Same refrigerant and category">
                  <LikeJobs recoveryYield={record.yield} likeJobs={record.likeJobs} />
                </Sheet>
              ) : null}
              <Sheet title="What the record says">
                <RecordFacts record={record} />
                <RecordSource source={record.source} />
              </Sheet>
            </>
          )}
          <Sheet title="History" aside={plural(history.length, 'entry', 'entries')}>
            <RecordHistoryList entries={history} />
          </Sheet>
        </div>
      </div>
    </>
  );
};
