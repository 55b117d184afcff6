import 'server-only';
import { accessTokenByHash } from '@/db/who-asks';
import { hashToken } from './tokens';
import type { AskingViewer } from './viewer';

/** Who a bearer token is, read anew at each request by one statement; null when it is unknown or revoked. */
export const viewerOfAccessToken = async (token: string): Promise<AskingViewer | null> => {
  const found = await accessTokenByHash(hashToken(token));
  if (!found) return null;
  const { tokenId, label, membership, revision } = found;
  return { kind: 'program', actor: `token ${tokenId}`, name: label, ...membership, revision };
};
