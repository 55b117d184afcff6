'use client';

import { clsx } from 'clsx';
import Link from 'next/link';
import { useScreens } from './use-screens';

/** The screens along the head of wide windows. */
export const MainNavigation = () => (
  <nav aria-label="Screens" className="hidden items-stretch lg:flex">
    {useScreens().map((screen) => (
      <Link
        key={screen.path}
        href={screen.href}
        aria-current={screen.current ? 'page' : undefined}
        className={clsx(
          'flex items-center border-y-3 border-transparent px-3 whitespace-nowrap',
          screen.current ? 'border-b-shoulder text-body-ink' : 'text-body-ink-2 hover:text-body-ink',
        )}
      >
        {screen.name}
      </Link>
    ))}
  </nav>
);
