import { PageTitle } from '../../../shared-ui/page-title';

export default function SignInPage() {
  return <PageTitle tab="Sign in">Sign in</PageTitle>;
}
