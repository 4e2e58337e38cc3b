import { PageTitle } from '../../../shared-ui/page-title';

export default function DuesPage() {
  return (
    <PageTitle tab="Dues">
      <b>Dues</b>
    </PageTitle>
  );
}
