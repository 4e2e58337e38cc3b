import { PageTitle } from '../../../shared-ui/page-title';

export default function MyBuildPage() {
  return (
    <PageTitle tab="My build">
      My <b>build</b>
    </PageTitle>
  );
}
