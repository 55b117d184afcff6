import type { APIRequestContext, APIResponse, PlaywrightWorkerArgs } from '@playwright/test';

type Credentials = { email: string; password: string };

const ADDRESS = process.env.E2E_ADDRESS ?? 'http://127.0.0.1:3000';

/** Posts the credentials as the sign-in form does, with the anti-forgery token that next-auth gave this context. */
export const postCredentials = async (
  request: APIRequestContext,
  { email, password }: Credentials,
): Promise<APIResponse> => {
  const { csrfToken } = await (await request.get('/api/auth/csrf')).json();
  return request.post('/api/auth/callback/credentials', {
    form: { csrfToken, email, password, json: 'true', callbackUrl: ADDRESS },
  });
};

/** Signs in without a page; gives the cookies that a browser would hold. */
export const signInByRequest = async (playwright: PlaywrightWorkerArgs['playwright'], credentials: Credentials) => {
  const request = await playwright.request.newContext({ baseURL: ADDRESS });
  const response = await postCredentials(request, credentials);
  if (!response.ok()) throw new Error(`Signing in as ${credentials.email} failed: ${await response.text()}`);
  const state = await request.storageState();
  await request.dispose();
  return state;
};
