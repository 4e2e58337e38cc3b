import { PageTitle } from '../../../shared-ui/page-title';

export default function ReviewPage() {
  return (
    <PageTitle tab="Review queue">
      Review <b>queue</b>
    </PageTitle>
  );
}
