import { Loading } from '@/ui/notices';

export default function WeekLoading() {
  return <Loading label="Ranking the week" lines={12} />;
}
