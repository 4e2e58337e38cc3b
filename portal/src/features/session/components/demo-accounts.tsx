import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { Club } from '../../../api-client/club';
import { capital } from '../../../lib/text';

/** Every account of the demo club has it; a club that is not a demo lists no accounts. */
const DEMO_PASSWORD = 'larkmoor-demo';

interface DemoAccountsProps {
  accounts: Club['demoAccounts'];
  onChoose: (email: string, password: string) => void;
}

/** The role, counted from the second holder on: 'Member', 'Member 2'. */
function nameOf(upTo: DemoAccountsProps['accounts'], role: string): string {
  const count = upTo.filter((account) => account.role === role).length;
  return count === 1 ? capital(role) : `${capital(role)} ${count}`;
}

/** In the demo club only: its accounts, one press to fill the form. */
export function DemoAccounts({ accounts, onChoose }: DemoAccountsProps) {
  if (accounts.length === 0) return null;
  return (
    <Box component="section" aria-labelledby="demo-accounts" sx={{ mt: '20px' }}>
      <Typography variant="h3" component="h2" id="demo-accounts">
        Demo club
      </Typography>
      <Typography variant="small" component="p" sx={{ m: '0 0 8px', color: 'token.ink2' }}>
        Choose an account to fill the form. The password of each is{' '}
        <span style={{ whiteSpace: 'nowrap' }}>{DEMO_PASSWORD}</span>.
      </Typography>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: '8px' }}>
        {accounts.map(({ email, role }, index) => (
          <Button key={email} size="small" title={email} onClick={() => onChoose(email, DEMO_PASSWORD)}>
            {nameOf(accounts.slice(0, index + 1), role)}
          </Button>
        ))}
      </Box>
    </Box>
  );
}
