import { PageTitle } from '../../../shared-ui/page-title';

export default function BuildNightsPage() {
  return (
    <PageTitle tab="Build nights">
      Build <b>nights</b>
    </PageTitle>
  );
}
