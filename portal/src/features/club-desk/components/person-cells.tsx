import Box from '@mui/material/Box';
import { capital } from '../../../lib/text';
import { PersonMark } from '../../../shared-ui/person-mark';
import type { DeskRow } from '../desk';

export const PersonCell = ({ person }: DeskRow) => (
  <Box component="span" sx={{ display: 'inline-flex', alignItems: 'center', gap: '10px' }}>
    <PersonMark name={person.name} />
    {person.name}
  </Box>
);

/** Member plain, what comes on top of it 700. */
export const RolesCell = ({ person }: DeskRow) => (
  <span>
    Member
    {person.roles
      .filter((role) => role !== 'member')
      .map((role) => (
        <b key={role}>, {capital(role)}</b>
      ))}
  </span>
);
