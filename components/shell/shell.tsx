import Link from 'next/link';
import type { ReactNode } from 'react';
import { AccountMenu } from './account-menu';
import type { AccountActions } from './account-panel';
import { BottomBar } from './bottom-bar';
import { Foot } from './foot';
import { KeySheet } from './key-sheet';
import { MainNavigation } from './main-navigation';
import { Wordmark } from './mark';

type ShellProps = AccountActions & { companyName: string; children: ReactNode };

/** The frame of every signed-in screen: yellow shoulder, grey body, the screens, who is here. */
export const Shell = ({ companyName, switchCompany, children }: ShellProps) => (
  <KeySheet>
    <a
      href="#main"
      className="absolute top-2 left-2 z-50 -translate-y-20 bg-sheet px-4 py-3 font-medium text-ink focus:translate-y-0"
    >
      Skip to the content
    </a>
    <header className="border-t-6 border-shoulder bg-body text-body-ink [--focus:var(--shoulder)] print:hidden">
      <div className="mx-auto flex h-14 max-w-page items-stretch gap-6 px-4 sm:px-8">
        <Link href="/" className="flex shrink-0 items-center">
          <Wordmark />
        </Link>
        <MainNavigation />
        <div className="ml-auto flex min-w-0 items-center">
          <span className="truncate text-sm text-body-ink-2 lg:hidden">{companyName}</span>
          <AccountMenu switchCompany={switchCompany} />
        </div>
      </div>
    </header>
    <main id="main" tabIndex={-1} className="mx-auto max-w-page px-4 pt-4 pb-12 outline-none sm:px-8 print:p-0">
      {children}
    </main>
    <Foot />
    <BottomBar switchCompany={switchCompany} />
  </KeySheet>
);
