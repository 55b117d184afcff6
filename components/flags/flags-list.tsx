import { useCallback, useEffect, useRef, useState } from 'react';
import type { FlaggedRecord } from '@/analytics/flags/by-record';
import type { DisplayUnit, FlagDecision } from '@/lib/vocabulary';
import { FlagItem, type FlagTask } from './flag-item';
import type { JustDecided } from './undo-notice';
import { useFlagKeys } from './use-flag-keys';

type FlagsListProps = {
  records: readonly FlaggedRecord[];
  unit: DisplayUnit;
  onDecided: (decided: JustDecided) => void;
};

/** Records that need a look, one under the other. The keyboard goes through them and lands on the next after a decision. */
export const FlagsList = ({ records, unit, onDecided }: FlagsListProps) => {
  const items = useRef(new Map<string, HTMLLIElement>());
  const [current, setCurrent] = useState<string | null>(null);
  const [task, setTask] = useState<FlagTask>(null);
  const [wanted, want] = useState<string | null>(null);

  // Focus moves once the list has been drawn: after a decision the record that had it is gone.
  useEffect(() => {
    if (wanted === null) return;
    items.current.get(wanted)?.focus();
    want(null);
  }, [wanted]);

  const goTo = useCallback((id: string | undefined) => {
    if (id === undefined) return;
    setCurrent(id);
    setTask(null);
    want(id);
  }, []);
  const at = records.findIndex(({ lead }) => lead.id === current);
  const idAt = (place: number) => records[place]?.lead.id;
  const next = useCallback(() => goTo(records[at + 1]?.lead.id), [goTo, records, at]);
  const previous = useCallback(() => goTo(records[Math.max(0, at - 1)]?.lead.id), [goTo, records, at]);
  const decide = useCallback(() => {
    const record = records[Math.max(0, at)];
    if (record?.lead.state !== 'open') return;
    setCurrent(record.lead.id);
    setTask('decide');
  }, [records, at]);
  useFlagKeys({ next, previous, decide });

  const decided = ({ lead }: FlaggedRecord, decision: FlagDecision) => {
    const place = records.findIndex((record) => record.lead.id === lead.id);
    goTo(idAt(place + 1) ?? idAt(place - 1));
    onDecided({ flagId: lead.id, recordRef: lead.recordRef, decision });
  };

  return (
    <ol>
      {records.map((record) => {
        const { id } = record.lead;
        return (
          <FlagItem
            key={id}
            record={record}
            unit={unit}
            task={id === current ? task : null}
            itemRef={(item) => {
              if (item) items.current.set(id, item);
              else items.current.delete(id);
            }}
            onTask={(wantedTask) => {
              setCurrent(id);
              setTask(wantedTask);
              if (wantedTask === null) want(id);
            }}
            onDecided={decided}
          />
        );
      })}
    </ol>
  );
};
