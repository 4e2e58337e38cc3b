import { PageTitle } from '../../../shared-ui/page-title';

export default function BenchBookPage() {
  return (
    <PageTitle tab="Bench book">
      Bench <b>book</b>
    </PageTitle>
  );
}
