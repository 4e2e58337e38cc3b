import Box from '@mui/material/Box';
import { clubDay } from '../../../lib/club-time';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { BuildNight } from '../api/nights';
import { mainSeries } from '../night-view';
import { byMonth } from '../night-words';
import { NightRow } from './night-row';

interface NightListProps {
  nights: readonly BuildNight[];
  openId?: string;
  onOpen: (nightId: string) => void;
  onError: (error: unknown) => void;
  /** What stands under an opened row. */
  opened?: React.ReactNode;
}

/** The same nights as in the month, as rows under the names of their months. */
export function NightList({ nights, openId, onOpen, onError, opened }: NightListProps) {
  const main = mainSeries(nights);
  const groups = byMonth(nights, (night) => clubDay(night.startsAt), clubDay());
  return groups.map(({ month, heading, nights: rows }, index) => (
    <Box component="section" key={month} aria-label={heading} sx={{ mb: '18px' }}>
      <SectionHeading end={index === 0 ? 'Coming up' : undefined}>{heading}</SectionHeading>
      <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {rows.map((night) => (
          <Row key={night.id} isOpen={night.id === openId} opened={opened}>
            <NightRow
              night={night}
              main={main}
              isOpen={night.id === openId}
              onOpen={onOpen}
              onError={onError}
            />
          </Row>
        ))}
      </Box>
    </Box>
  ));
}

interface RowProps {
  isOpen: boolean;
  opened?: React.ReactNode;
  children: React.ReactNode;
}

function Row({ isOpen, opened, children }: RowProps) {
  return (
    <>
      {children}
      {isOpen && opened && (
        <Box component="li" sx={{ my: '12px' }}>
          {opened}
        </Box>
      )}
    </>
  );
}
