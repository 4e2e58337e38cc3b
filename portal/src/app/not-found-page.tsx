import Button from '@mui/material/Button';
import { Link } from 'react-router-dom';
import { EmptyState } from '../shared-ui/empty-state';
import { PageTitle } from '../shared-ui/page-title';

export function NotFoundPage() {
  return (
    <>
      <PageTitle tab="No such page">
        No such <b>page</b>
      </PageTitle>
      <EmptyState
        title="There is nothing at this address"
        action={
          <Button component={Link} to="/">
            Open Tonight
          </Button>
        }
      >
        The address may be mistyped, or what it named has been taken away.
      </EmptyState>
    </>
  );
}
