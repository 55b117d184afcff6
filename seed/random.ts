export { type Random, seededRandom } from '@/lib/random';
