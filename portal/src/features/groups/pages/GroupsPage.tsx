import { PageTitle } from '../../../shared-ui/page-title';

export default function GroupsPage() {
  return (
    <PageTitle tab="Groups">
      <b>Groups</b>
    </PageTitle>
  );
}
