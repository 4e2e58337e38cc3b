import Box from '@mui/material/Box';
import { useState } from 'react';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import type { BuildNight } from '../api/nights';
import { isTonight } from '../night-view';
import { NightList } from './night-list';
import { NightPanel } from './night-panel';
import { TonightCard } from './tonight-card';

interface ListViewProps {
  nights: readonly BuildNight[];
  isPhone: boolean;
  openId?: string;
  onOpen: (nightId: string) => void;
  onChange: (nightId: string) => void;
}

/** Tonight on its own, then every night that follows, by month. An opened row shows the night under it. */
export function ListView({ nights, openId, onOpen, onChange }: ListViewProps) {
  const [error, setError] = useState<unknown>();
  const now = new Date();
  const tonight = nights.find((night) => !night.cancelledAt && isTonight(night, now));
  const rest = nights.filter((night) => night !== tonight);
  const opened = openId && <NightPanel nightId={openId} onChange={onChange} />;
  return (
    <Box sx={{ maxWidth: 860 }}>
      {error !== undefined && (
        <Box sx={{ mb: '12px' }}>
          <ProblemAlert error={error} title="Your answer was not taken." />
        </Box>
      )}
      {tonight && <TonightCard night={tonight} onOpen={onOpen} onError={setError} />}
      {tonight && tonight.id === openId && <Box sx={{ mb: '16px' }}>{opened}</Box>}
      <NightList
        nights={rest}
        openId={openId}
        onOpen={(id) => onOpen(id)}
        onError={setError}
        opened={opened}
      />
    </Box>
  );
}
