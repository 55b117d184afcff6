'use client';

import { useReopen } from '@/analytics/flags/hook';
import { TextButton } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { DECISION_WORDS } from '@/lib/flags/words';
import type { FlagDecision } from '@/lib/vocabulary';

/** What was just decided. */
export type JustDecided = { flagId: string; recordRef: string; decision: FlagDecision };

/** Says what was just decided and takes it back for who pressed the wrong button. */
export const UndoNotice = ({ decided, onGone }: { decided: JustDecided; onGone: () => void }) => {
  const { mutate, isPending, error } = useReopen();
  const { name, follows } = DECISION_WORDS[decided.decision];
  return (
    <Notice
      tone="good"
      announce
      className="sticky bottom-20 z-20 lg:bottom-3 max-w-xl self-start shadow-md print:hidden"
    >
      <span className="font-semibold text-ink">
        {decided.recordRef}: {name.toLowerCase()}.
      </span>{' '}
      It {follows}.{' '}
      <TextButton disabled={isPending} onClick={() => mutate({ id: decided.flagId }, { onSuccess: onGone })}>
        Reopen
      </TextButton>
      {error ? <span className="block font-medium text-danger">{error.message}</span> : null}
    </Notice>
  );
};
