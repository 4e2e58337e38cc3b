import { PageTitle } from '../../../shared-ui/page-title';

export default function LevelPage() {
  return (
    <PageTitle tab="Level diagram">
      Level <b>diagram</b>
    </PageTitle>
  );
}
