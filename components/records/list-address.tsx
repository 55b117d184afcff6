'use client';

import { createContext } from 'react';

/** The search string of the list that records are shown out of, where it is not the screen's own address. */
export const ListAddress = createContext<string | null>(null);
