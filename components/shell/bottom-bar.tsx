'use client';

import { clsx } from 'clsx';
import Link from 'next/link';
import { useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { type AccountActions, AccountPanel } from './account-panel';
import { useScreens } from './use-screens';

/** As many as a thumb hits safely at 320 px. */
const MOST_DIRECT = 4;

const slot = (current: boolean) =>
  clsx(
    'flex min-h-14 flex-auto items-center justify-center border-t-3 px-1.5 text-center text-xs leading-tight',
    current ? 'border-shoulder font-semibold text-body-ink' : 'border-transparent text-body-ink-2',
  );

/** The screens at the foot of narrow windows, within reach of the thumb; the rest stands under "More". */
export const BottomBar = (actions: AccountActions) => {
  const [open, setOpen] = useState(false);
  const screens = useScreens();
  const direct = screens.slice(0, MOST_DIRECT);
  const rest = screens.slice(MOST_DIRECT);
  return (
    <nav
      aria-label="Screens"
      className="fixed inset-x-0 bottom-0 z-30 flex bg-body pb-[env(safe-area-inset-bottom)] [--focus:var(--shoulder)] lg:hidden print:hidden"
    >
      {direct.map((screen) => (
        <Link
          key={screen.path}
          href={screen.href}
          aria-current={screen.current ? 'page' : undefined}
          className={slot(screen.current)}
        >
          {screen.name}
        </Link>
      ))}
      <button type="button" className={slot(rest.some((screen) => screen.current))} onClick={() => setOpen(true)}>
        More
      </button>
      <Dialog open={open} onOpenChange={setOpen} title="More">
        {rest.length ? (
          <ul className="mb-4 border-b border-rule pb-3">
            {rest.map((screen) => (
              <li key={screen.path}>
                <Link
                  href={screen.href}
                  aria-current={screen.current ? 'page' : undefined}
                  onClick={() => setOpen(false)}
                  className="flex min-h-12 items-center text-lg aria-[current=page]:font-semibold"
                >
                  {screen.name}
                </Link>
              </li>
            ))}
          </ul>
        ) : null}
        <AccountPanel {...actions} />
      </Dialog>
    </nav>
  );
};
