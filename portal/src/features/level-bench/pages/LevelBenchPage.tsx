import { PageTitle } from '../../../shared-ui/page-title';

export default function LevelBenchPage() {
  return (
    <PageTitle tab="Level bench">
      Level <b>bench</b>
    </PageTitle>
  );
}
