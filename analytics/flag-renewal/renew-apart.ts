import 'server-only';
import { spawn } from 'node:child_process';
import { setPriority } from 'node:os';
import { isLongRenewal, type RenewalPayload, renewFlags } from './renew';

/** As it lies in the checkout, which is where every server of the product starts. */
const PROCESS = 'analytics/flag-renewal/renewal-process.ts';
/** Pages go first. */
const NICE = 5;
const MOST_SAID = 4_000;

const inProcessOfItsOwn = ({ companyId }: RenewalPayload): Promise<void> =>
  new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--conditions=react-server', '--import', 'tsx', PROCESS, companyId], {
      stdio: ['pipe', 'ignore', 'pipe'],
    });
    let said = '';
    child.stderr.on('data', (text: Buffer) => {
      said = `${said}${text}`.slice(-MOST_SAID);
    });
    child.on('spawn', () => {
      if (child.pid) setPriority(child.pid, NICE);
    });
    child.on('error', reject);
    child.on('exit', (code, signal) =>
      code === 0 ? resolve() : reject(new Error(`The renewal of flags ended with ${code ?? signal}: ${said}`)),
    );
  });

/**
 * Renews what is due of a company's flags; a long renewal in a process of its own, because it would keep this one from
 * answering. Throws what went wrong, also there.
 */
export const renewApart = async (payload: RenewalPayload): Promise<void> =>
  (await isLongRenewal(payload)) ? inProcessOfItsOwn(payload) : renewFlags(payload);
