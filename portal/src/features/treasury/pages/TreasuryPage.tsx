import { PageTitle } from '../../../shared-ui/page-title';

export default function TreasuryPage() {
  return (
    <PageTitle tab="Treasury">
      <b>Treasury</b>
    </PageTitle>
  );
}
