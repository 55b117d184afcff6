import type { DatabaseUrls } from '@/db/cluster/urls';

export const DEMO_SIGN_INS: { role: string; email: string; password: string }[] = [];

export const seedDemoIfEmpty = async (_urls: DatabaseUrls, _say: (line: string) => void): Promise<void> => {};
