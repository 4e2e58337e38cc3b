import { PageTitle } from '../../../shared-ui/page-title';

export default function YouPage() {
  return (
    <PageTitle tab="You">
      <b>You</b>
    </PageTitle>
  );
}
