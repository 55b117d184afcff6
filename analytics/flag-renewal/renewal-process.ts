import { workAlone } from '@/lib/jobs/own-process';
import { renewalPayload, renewFlags } from './renew';

/* A process of its own for a long renewal, started by renew-apart.ts. */
workAlone((companyId) => renewFlags(renewalPayload.parse({ companyId })));
