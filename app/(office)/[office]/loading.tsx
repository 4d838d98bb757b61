import { Page } from '@/components/shell/page';
import { Loading } from '@/components/ui/states';

export default function OfficeLoading() {
  return (
    <Page title="One moment">
      <Loading label="Opening the page" rows={4} />
    </Page>
  );
}
