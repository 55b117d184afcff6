'use client';

import { usePathname, useSearchParams } from 'next/navigation';
import { keptScope } from '@/analytics/scope-address';
import { useViewer } from '@/components/viewer-context';
import { type Screen, screensFor } from './screens';

/** The viewer's screens with their addresses, the scope carried along, and which one is open. */
export const useScreens = (): (Screen & { href: string; current: boolean })[] => {
  const { allowed } = useViewer();
  const pathname = usePathname();
  const kept = keptScope(useSearchParams());
  return screensFor(allowed).map((screen) => ({
    ...screen,
    href: screen.scoped ? `${screen.path}${kept}` : screen.path,
    current:
      pathname === screen.path || (screen.path !== '/' && pathname.startsWith(`${screen.within ?? screen.path}/`)),
  }));
};
