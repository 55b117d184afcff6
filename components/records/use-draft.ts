'use client';

import { useEffect, useState } from 'react';
import { v7 as newKey } from 'uuid';
import { RECORD_FIELDS, type RecordTexts } from '@/lib/recoveries/fields';

/** What is being typed, and the key under which it is sent: once written, the same draft is the same record. */
type Draft = { texts: RecordTexts; key: string };

const isTexts = (value: unknown): value is RecordTexts =>
  typeof value === 'object' &&
  value !== null &&
  RECORD_FIELDS.every((field) => field in value && typeof Reflect.get(value, field) === 'string');

const kept = (place: string): Draft | null => {
  try {
    const draft: unknown = JSON.parse(window.localStorage.getItem(place) ?? 'null');
    if (typeof draft !== 'object' || draft === null) return null;
    const [texts, key]: unknown[] = [Reflect.get(draft, 'texts'), Reflect.get(draft, 'key')];
    return isTexts(texts) && typeof key === 'string' ? { texts, key } : null;
  } catch {
    // A browser may refuse storage, and what stands there may be anybody's.
    return null;
  }
};

const keep = (place: string, draft: Draft | null): void => {
  try {
    if (draft) window.localStorage.setItem(place, JSON.stringify(draft));
    else window.localStorage.removeItem(place);
  } catch {
    // Without storage the draft lives as long as the page.
  }
};

/** A draft that outlives the page: a call, a dead battery or a reload takes nothing of what was typed. */
export const useDraft = (place: string, empty: RecordTexts) => {
  const [draft, setDraft] = useState<Draft>(() => ({ texts: empty, key: newKey() }));
  const [found, setFound] = useState(false);
  // Storage is the browser's: what it keeps is put in after the server's first picture.
  useEffect(() => {
    const before = kept(place);
    if (!before) return;
    setDraft(before);
    setFound(true);
  }, [place]);
  const change = (texts: RecordTexts) => {
    const next = { ...draft, texts };
    setDraft(next);
    keep(place, next);
  };
  const clear = () => {
    keep(place, null);
    setDraft({ texts: empty, key: newKey() });
    setFound(false);
  };
  return { ...draft, found, change, clear };
};
