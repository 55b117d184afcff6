import { Loading } from '@/components/ui/states';

export default function RecordsLoading() {
  return <Loading minHeight={480} />;
}
