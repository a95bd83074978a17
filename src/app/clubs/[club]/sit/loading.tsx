import { Loading } from '@/ui/notices';

export default function SitLoading() {
  return <Loading label="Ranking the stands" lines={9} />;
}
