import { TrendsLoading } from '@/components/trends/trends-loading';

export default function Loading() {
  return <TrendsLoading />;
}
