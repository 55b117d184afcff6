import { spawn } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { viewerOfAccessToken } from '@/lib/auth/access-tokens';
import { personOfLink, setPasswordByLink } from '@/lib/auth/password-links';
import { companiesNamed, createCompany } from '@/lib/auth/provision';

/** Runs a command as `npm run` does, against the database of this run. */
const command = (name: 'company' | 'token' | 'reset-demo', ...args: string[]) =>
  new Promise<{ code: number | null; out: string; err: string }>((resolve) => {
    const child = spawn(
      process.execPath,
      ['--conditions=react-server', '--import', 'tsx', `lib/launch/${name}.ts`, ...args],
      {
        env: {
          ...process.env,
          DATABASE_URL: process.env.ADMIN_DATABASE_URL,
          TAREBOOK_SECRET: process.env.NEXTAUTH_SECRET,
          NEXTAUTH_URL: 'https://book.example.test',
        },
      },
    );
    const written = { out: '', err: '' };
    child.stdout.on('data', (piece) => {
      written.out += String(piece);
    });
    child.stderr.on('data', (piece) => {
      written.err += String(piece);
    });
    child.on('close', (code) => resolve({ code, ...written }));
  });

test('a company is made with an owner whose link sets a password once', async () => {
  const name = `Kestrel Row Cooling ${randomUUID()}`;
  const email = `owner-${randomUUID()}@example.test`;
  const { code, out } = await command(
    'company',
    '--name',
    name,
    '--owner-email',
    email,
    '--time-zone',
    'America/Denver',
  );
  expect(code).toBe(0);
  const [, link = ''] = /^https:\/\/book\.example\.test\/set-password\/(tb_link_[\w-]+)\n$/.exec(out) ?? [];
  expect(await personOfLink(link)).toMatchObject({ email });
  expect(await setPasswordByLink(link, 'a password of some length')).toBe(true);
  expect(await setPasswordByLink(link, 'another password of length')).toBe(false);

  const again = await command('company', '--name', name, '--owner-email', email);
  expect(again).toMatchObject({ code: 1, out: '', err: expect.stringContaining('already a company named') });

  const token = await command('token', '--company', name, '--role', 'trainer');
  expect(token).toMatchObject({ code: 0, out: expect.stringMatching(/^tb_api_[\w-]{43}\n$/) });
  expect(await viewerOfAccessToken(token.out.trim())).toMatchObject({
    companyName: name,
    role: 'trainer',
    timeZone: 'America/Denver',
  });
});

test.each([
  [['--name', 'X'], '--owner-email is missing.'],
  [['--name', ' ', '--owner-email', 'a@example.test'], '--name is empty.'],
  [['--name', 'X', '--owner-email', 'nobody'], '--owner-email is not an e-mail address.'],
  [['--name', 'X', '--owner-email', 'a@example.test', '--time-zone', 'Mars/Base'], '--time-zone is no IANA time zone'],
  [['--name', 'X', '--owner-email', 'a@example.test', '--mass-unit', 'stone'], '--mass-unit is one of lb, kg.'],
  [['--name', 'X', '--color', 'grey'], 'Usage: npm run company'],
])('company %j ends with code 1 and “%s”', async (args, sentence) => {
  const { code, out, err } = await command('company', ...args);
  expect({ code, out }).toEqual({ code: 1, out: '' });
  expect(err).toContain(sentence);
  expect(err).not.toMatch(/^\s+at /m);
  expect(await companiesNamed('X')).toEqual([]);
});

test('a token needs a known role and exactly one company of the name', async () => {
  const name = `Twin ${randomUUID()}`;
  const unknown = await command('token', '--company', name, '--role', 'owner');
  expect(unknown).toMatchObject({ code: 1, out: '', err: `There is no company named “${name}”.\n` });
  await createCompany(name);
  const king = await command('token', '--company', name, '--role', 'king');
  expect(king).toMatchObject({ code: 1, out: '', err: expect.stringContaining('“king” is no role; roles are owner,') });
  await createCompany(name);
  const twins = await command('token', '--company', name, '--role', 'owner');
  expect(twins).toMatchObject({ code: 1, out: '', err: expect.stringContaining('Two companies are named') });
});

test('the demo’s reset refuses a company that is not the demo', async () => {
  const name = `Real records ${randomUUID()}`;
  await createCompany(name);
  const refused = await command('reset-demo', '--company', name);
  expect(refused).toMatchObject({ code: 1, err: expect.stringContaining('is not a demo company') });
  expect(await companiesNamed(name)).toHaveLength(1);
});
