import { PageTitle } from '../../../shared-ui/page-title';

export default function ClubDeskPage() {
  return (
    <PageTitle tab="Club desk">
      Club <b>desk</b>
    </PageTitle>
  );
}
