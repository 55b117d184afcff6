'use client';

import { Popover } from '@/components/ui/popover';
import { useViewer } from '@/components/viewer-context';
import { type AccountActions, AccountPanel } from './account-panel';

/** Company and person at the end of the head; opens the account panel. */
export const AccountMenu = (actions: AccountActions) => {
  const { name, companyName } = useViewer();
  return (
    <Popover
      label="Account"
      align="end"
      className="p-4"
      trigger={
        <button
          type="button"
          className="hidden min-w-0 items-center gap-3 text-sm text-body-ink-2 hover:text-body-ink lg:flex"
        >
          <span className="max-w-56 truncate max-xl:hidden">{companyName}</span>
          <span className="max-w-40 truncate text-body-ink">{name}</span>
          <svg width="10" height="6" viewBox="0 0 10 6" aria-hidden="true">
            <path d="M1 1l4 4 4-4" fill="none" stroke="currentColor" strokeWidth="1.5" />
          </svg>
        </button>
      }
    >
      <AccountPanel {...actions} />
    </Popover>
  );
};
