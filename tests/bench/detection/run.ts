import { measureDetection } from './detection';

const [which = 'proof', count = '20', size = '4000'] = process.argv.slice(2);
await measureDetection(which, Number(count), Number(size));
