import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { formatDay } from '../../../lib/club-time-text';
import type { NightDetail } from '../api/nights';

/** Who is coming, and who waits in which order. */
export function NightGuests({ night }: { night: NightDetail }) {
  const { comingPeople, waitingPeople } = night;
  return (
    <div>
      <Heading>Coming</Heading>
      {comingPeople.length === 0 ? (
        <Quiet>Nobody has said so yet.</Quiet>
      ) : (
        <Box
          component="ul"
          sx={{ columns: { xs: 2, md: 2 }, columnGap: '16px', m: '5px 0 0', p: 0, listStyle: 'none' }}
        >
          {comingPeople.map(({ id, name }) => (
            <Line key={id}>{name}</Line>
          ))}
        </Box>
      )}
      {waitingPeople.length > 0 && (
        <Box sx={{ mt: '12px' }}>
          <Heading>Waiting, in order</Heading>
          <Box component="ol" sx={{ m: '5px 0 0', p: 0, listStyle: 'none' }}>
            {waitingPeople.map(({ id, name, saidAt }, index) => (
              <Line key={id}>
                <Box component="span" sx={{ color: 'token.ink3', mr: '6px' }}>
                  {index + 1}
                </Box>
                {name}
                <Box component="span" sx={{ float: 'right', color: 'token.ink2', fontWeight: 400 }}>
                  since {formatDay(saidAt)}
                </Box>
              </Line>
            ))}
          </Box>
        </Box>
      )}
    </div>
  );
}

/** Mentors on duty and the stages in focus. */
export function NightTeam({ night }: { night: NightDetail }) {
  const { mentors, stages } = night;
  return (
    <div>
      <Heading>Mentors on duty</Heading>
      <List>
        {mentors.map(({ id, name }) => (
          <Line key={id}>{name}</Line>
        ))}
      </List>
      {stages.length > 0 && (
        <Box sx={{ mt: '12px' }}>
          <Heading>Stages in focus</Heading>
          <List>
            {stages.map(({ id, position, name }) => (
              <Line key={id}>
                <b>{position}</b> {name}
              </Line>
            ))}
          </List>
        </Box>
      )}
    </div>
  );
}

const Heading = ({ children }: { children: React.ReactNode }) => (
  <Typography variant="h3" sx={{ pb: '4px', borderBottom: '1px solid', borderColor: 'token.ink' }}>
    {children}
  </Typography>
);

const List = ({ children }: { children: React.ReactNode }) => (
  <Box component="ul" sx={{ m: '5px 0 0', p: 0, listStyle: 'none' }}>
    {children}
  </Box>
);

const Line = ({ children }: { children: React.ReactNode }) => (
  <Box
    component="li"
    sx={{ fontSize: '0.8125rem', lineHeight: '1.25rem', fontWeight: 600, breakInside: 'avoid' }}
  >
    {children}
  </Box>
);

const Quiet = ({ children }: { children: React.ReactNode }) => (
  <Box sx={{ mt: '6px', typography: 'small', color: 'token.ink2' }}>{children}</Box>
);
