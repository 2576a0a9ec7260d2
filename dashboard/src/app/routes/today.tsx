import { PageHeader } from '@/components/ui/page-header';

export function TodayRoute() {
  return <PageHeader title="Today" />;
}
