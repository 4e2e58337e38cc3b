import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { clubDay } from '../../../lib/club-time';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { DockedDrawer } from '../../../shared-ui/docked-drawer';
import { InstrumentStateLine } from '../../../shared-ui/states/state-line';
import type { Instrument } from '../api/instruments';
import { stateOf } from '../instrument-words';
import { InstrumentFacts } from './instrument-facts';

interface InstrumentDrawerProps {
  instrument: Instrument;
  onClose: () => void;
  /** What a steward may do with it; the list offers to book it. */
  children?: ReactNode;
}

/** One instrument, opened beside its list. */
export function InstrumentDrawer({ instrument, onClose, children }: InstrumentDrawerProps) {
  const { state, words } = stateOf(instrument, clubDay());
  const query = new URLSearchParams({ show: instrument.tag, need: instrument.kind.name });
  return (
    <DockedDrawer
      open
      width={420}
      title={`${instrument.tag} ${instrument.name}`}
      head={
        <>
          <Box sx={{ display: 'flex', alignItems: 'center', gap: '10px' }}>
            <AssetTag>{instrument.tag}</AssetTag>
            <InstrumentStateLine state={state}>{words}</InstrumentStateLine>
          </Box>
          <Box component="h2" sx={{ m: '4px 0 0', fontSize: '1.375rem', lineHeight: '1.9rem' }}>
            {instrument.name}
          </Box>
        </>
      }
      onClose={onClose}
      footer={
        instrument.mayBook && (
          <Button variant="contained" component={Link} to={`/bench-book?${query.toString()}`}>
            Book it
          </Button>
        )
      }
    >
      {children}
      <InstrumentFacts instrument={instrument} />
    </DockedDrawer>
  );
}
