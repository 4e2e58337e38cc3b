import { PageTitle } from '../../../shared-ui/page-title';

export default function StagePage() {
  return (
    <PageTitle tab="Stage">
      <b>Stage</b>
    </PageTitle>
  );
}
