import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Banner } from '../shared-ui/banner';
import { NotFoundPage } from './not-found-page';

const isMissingPart = (error: unknown): boolean =>
  error instanceof TypeError && /dynamically imported module|module script/i.test(error.message);

/** A page that broke, or whose code did not arrive; the frame around it still works. */
export function ErrorPage() {
  const error = useRouteError();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFoundPage />;
  const title = isMissingPart(error) ? 'This page did not arrive.' : 'This page stopped working.';
  return (
    <Box sx={{ maxWidth: 560, pt: '12px' }}>
      <Banner
        kind="failed"
        title={title}
        action={<Button onClick={() => location.reload()}>Load it again</Button>}
      >
        What you typed is kept on this device and comes back when the page does.
      </Banner>
    </Box>
  );
}
