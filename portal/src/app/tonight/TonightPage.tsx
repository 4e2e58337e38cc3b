import { PageTitle } from '../../shared-ui/page-title';

export default function TonightPage() {
  return (
    <PageTitle tab="Tonight">
      <b>Tonight</b>
    </PageTitle>
  );
}
