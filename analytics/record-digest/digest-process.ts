import { workAlone } from '@/lib/jobs/own-process';
import { digestPayload, digestRecords } from './digest';

/* A process of its own for a long digest, started by `digestApart`. */
workAlone((companyId) => digestRecords(digestPayload.parse({ companyId })));
