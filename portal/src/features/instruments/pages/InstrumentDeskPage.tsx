import { PageTitle } from '../../../shared-ui/page-title';

export default function InstrumentDeskPage() {
  return (
    <PageTitle tab="Instrument desk">
      Instrument <b>desk</b>
    </PageTitle>
  );
}
