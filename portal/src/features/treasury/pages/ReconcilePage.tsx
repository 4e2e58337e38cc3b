import { PageTitle } from '../../../shared-ui/page-title';

export default function ReconcilePage() {
  return (
    <PageTitle tab="Reconcile">
      <b>Reconcile</b>
    </PageTitle>
  );
}
