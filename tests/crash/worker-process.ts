import { startWorker } from '@/lib/jobs/worker';

// A process that works the queue until it is killed.
startWorker();
