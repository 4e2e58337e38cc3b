import Box from '@mui/material/Box';
import { counted } from '../../../lib/text';
import { PersonMark } from '../../../shared-ui/person-mark';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { Group } from '../api/groups';

/** A group and the people in it. */
export function GroupCard({ group }: { group: Group }) {
  return (
    <section aria-label={group.name}>
      <SectionHeading end={group.mine ? 'You are in it' : counted(group.members.length, 'member')}>
        {group.name}
      </SectionHeading>
      {group.about && <Box sx={{ typography: 'small', color: 'token.ink2', pt: '8px' }}>{group.about}</Box>}
      <Box component="ul" sx={{ listStyle: 'none', p: 0, m: '4px 0 0' }}>
        {group.members.map(({ personId, name }) => (
          <Box
            key={personId}
            component="li"
            sx={{
              display: 'flex',
              alignItems: 'center',
              gap: '10px',
              minHeight: 44,
              borderBottom: '1px solid',
              borderColor: 'token.rule',
            }}
          >
            <PersonMark name={name} size={28} />
            {name}
          </Box>
        ))}
      </Box>
    </section>
  );
}
