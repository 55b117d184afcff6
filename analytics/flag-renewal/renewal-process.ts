import { renewalPayload, renewFlags } from './renew';

/* A process of its own for a long renewal: started by renew-apart.ts, gone with whoever started it. */
process.stdin.resume().on('end', () => process.exit(1));

renewFlags(renewalPayload.parse({ companyId: process.argv[2] })).then(
  () => process.exit(0),
  (error: unknown) => {
    console.error(error);
    process.exit(1);
  },
);
