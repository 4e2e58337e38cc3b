import { PageTitle } from '../../../shared-ui/page-title';

export default function InstrumentsPage() {
  return (
    <PageTitle tab="Instruments">
      <b>Instruments</b>
    </PageTitle>
  );
}
