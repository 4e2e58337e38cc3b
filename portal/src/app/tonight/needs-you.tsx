import { useQuery } from '@tanstack/react-query';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import Typography from '@mui/material/Typography';
import { Link as RouterLink } from 'react-router-dom';
import { useMe } from '../../api-client/session';
import { useMyBuilds } from '../../features/builds/api/builds';
import { useReviews } from '../../features/builds/api/reviews';
import { checkPath } from '../../features/builds/logic/stage';
import { myInvoicesQuery } from '../../features/dues/api/dues';
import { instrumentListQuery } from '../../features/instruments/api/instruments';
import { summaryQuery } from '../../features/treasury/api/treasury';
import { dayText } from '../../lib/club-time-text';
import { capital, counted } from '../../lib/text';
import { formatMoney } from '../../lib/money';
import { usePhone } from '../../shared-ui/use-phone';
import { SectionHeading } from '../../shared-ui/section-heading';

interface Need {
  /** Two alike invoices have the same words. */
  id: string;
  title: string;
  detail: string;
  act: string;
  path: string;
}

/** What waits on this person, the role's own first: a mentor's queue, a steward's instruments, a treasurer's dues. */
function useNeeds(): Need[] {
  const me = useMe();
  const builds = useMyBuilds();
  const reviews = useReviews(me.hasRole('mentor'));
  const invoices = useQuery(myInvoicesQuery);
  const instruments = useQuery({ ...instrumentListQuery, enabled: me.hasRole('steward') });
  const treasury = useQuery({ ...summaryQuery, enabled: me.hasRole('treasurer') });
  const waiting = (reviews.data?.items ?? []).filter(({ isOwn }) => !isOwn);
  const broken = (instruments.data ?? []).filter(({ condition }) => condition !== 'ready');
  const needs: Need[] = [];
  if (waiting.length > 0)
    needs.push({
      id: 'reviews',
      title: `${capital(counted(waiting.length, 'stage'))} waiting for a mentor`,
      detail: `${waiting[0]?.builder.name}, stage ${waiting[0]?.stagePosition} ${waiting[0]?.stageName}, has waited longest.`,
      act: 'Review',
      path: '/review',
    });
  if (broken.length > 0)
    needs.push({
      id: 'instruments',
      title: `${capital(counted(broken.length, 'instrument'))} not ready`,
      detail: broken.map(({ tag }) => tag).join(', '),
      act: 'Open',
      path: '/instrument-desk',
    });
  if (treasury.data && treasury.data.latePeople > 0)
    needs.push({
      id: 'late dues',
      title: `Dues late from ${counted(treasury.data.latePeople, 'person', 'people')}`,
      detail: `${formatMoney(treasury.data.lateMinor)} past its day.`,
      act: 'Open',
      path: '/treasury',
    });
  for (const build of builds.data ?? []) {
    const back = build.stages.find(({ state }) => state === 'sent back');
    if (back)
      needs.push({
        id: back.id,
        title: `Stage ${back.position} ${back.name} was sent back`,
        detail: back.events.at(-1)?.note ?? '',
        act: 'Open',
        path: checkPath(build.id, back.id),
      });
    const last = build.stages.at(-1);
    if (
      last?.cautions.includes('licence needed') &&
      !build.licenceSeenAt &&
      build.stages.filter(({ state }) => state === 'signed off').length * 2 >= build.stages.length
    )
      needs.push({
        id: `licence ${build.id}`,
        title: 'Show your licence to an organiser',
        detail: `Stage ${last.position} ${last.name} stays locked until then.`,
        act: 'How',
        path: checkPath(build.id, last.id),
      });
  }
  const open = (invoices.data ?? []).filter(({ openMinor }) => openMinor > 0);
  for (const { id, description, openMinor, dueOn } of open.slice(0, 2))
    needs.push({
      id,
      title: description,
      detail: `${formatMoney(openMinor)}, due ${dayText(dueOn)}.`,
      act: 'Pay',
      path: `/dues?invoice=${id}`,
    });
  return needs;
}

/** The page's one copper heading. */
export function NeedsYou() {
  const needs = useNeeds();
  const isPhone = usePhone();
  if (needs.length === 0) return null;
  return (
    <section aria-labelledby="needs-you">
      <SectionHeading id="needs-you" needsYou end={needs.length}>
        Needs you
      </SectionHeading>
      <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {needs.map(({ id, title, detail, act, path }) => (
          <Box
            component="li"
            key={id}
            sx={{
              display: 'flex',
              justifyContent: 'space-between',
              gap: '12px',
              py: '11px',
              borderBottom: '1px solid',
              borderColor: 'token.rule',
            }}
          >
            <div>
              <b>{title}</b>
              <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
                {detail}
              </Typography>
            </div>
            <Box
              sx={{
                display: 'flex',
                alignItems: { xs: 'center', md: 'flex-start' },
                minHeight: { xs: 44, md: 0 },
              }}
            >
              {isPhone ? (
                <Button component={RouterLink} to={path} aria-label={`${act}: ${title}`}>
                  {act}
                </Button>
              ) : (
                <Link
                  component={RouterLink}
                  to={path}
                  aria-label={`${act}: ${title}`}
                  sx={{ fontWeight: 700 }}
                >
                  {act}
                </Link>
              )}
            </Box>
          </Box>
        ))}
      </Box>
    </section>
  );
}
