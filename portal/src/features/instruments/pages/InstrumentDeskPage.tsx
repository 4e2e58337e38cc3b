import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { clubDay } from '../../../lib/club-time';
import { dateText } from '../../../lib/club-time-text';
import { EmptyState } from '../../../shared-ui/empty-state';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { InstrumentStateLine } from '../../../shared-ui/states/state-line';
import { instrumentListQuery, type Instrument } from '../api/instruments';
import { CalibrationForm, ConditionForm } from '../components/care-forms';
import { ClearanceList } from '../components/clearance-list';
import { DeskRow } from '../components/desk-rows';
import { InstrumentDrawer } from '../components/instrument-drawer';
import { calibrationState, stateOf } from '../instrument-words';

/** How far ahead calibrations are listed. */
const AHEAD_DAYS = 100;

export default function InstrumentDeskPage() {
  const list = useQuery(instrumentListQuery);
  return (
    <>
      <PageTitle tab="Instrument desk">
        Instrument <b>desk</b>
      </PageTitle>
      {list.isPending && <LoadingBars rows={8} label="Loading instruments" />}
      {list.isError && <ProblemAlert error={list.error} onRetry={() => void list.refetch()} />}
      {list.data && <Desk instruments={list.data} />}
    </>
  );
}

function Desk({ instruments }: { instruments: Instrument[] }) {
  const today = clubDay();
  const [openId, setOpenId] = useState<string>();
  const opened = instruments.find(({ id }) => id === openId);
  const due = instruments
    .flatMap((instrument) => {
      const state = calibrationState(instrument, today);
      return state && state.days <= AHEAD_DAYS ? [{ instrument, state }] : [];
    })
    .sort((a, b) => a.state.days - b.state.days);
  const faults = instruments.filter(({ condition, conditionNote }) => condition !== 'ready' || conditionNote);
  const row = (instrument: Instrument) => ({
    instrument,
    isOpen: instrument.id === openId,
    onOpen: () => setOpenId(instrument.id),
  });
  return (
    <>
      <Box
        sx={{
          display: 'grid',
          gridTemplateColumns: { md: '1fr 1fr' },
          gap: '28px 30px',
          alignItems: 'start',
        }}
      >
        <section aria-label="Calibration due">
          <SectionHeading end={`Next ${AHEAD_DAYS} days`}>Calibration due</SectionHeading>
          {due.length === 0 && <EmptyState title="All in date" />}
          {due.map(({ instrument, state }) => (
            <DeskRow
              key={instrument.id}
              {...row(instrument)}
              end={
                state.isPast || state.isSoon ? (
                  <InstrumentStateLine state="calibration due">
                    {state.isPast ? 'Past' : `in ${state.days} days`}
                  </InstrumentStateLine>
                ) : (
                  <span>in {state.days} days</span>
                )
              }
              line={instrument.calibrationDueOn ? dateText(instrument.calibrationDueOn) : 'None on record'}
            />
          ))}
        </section>
        <section aria-label="Faults">
          <SectionHeading end={`${faults.length} open`}>Faults</SectionHeading>
          {faults.length === 0 && <EmptyState title="All in order" />}
          {faults.map((instrument) => {
            const { state, words } = stateOf(instrument, today);
            return (
              <DeskRow
                key={instrument.id}
                {...row(instrument)}
                end={<InstrumentStateLine state={state}>{words}</InstrumentStateLine>}
                line={instrument.conditionNote}
              />
            );
          })}
        </section>
        <ClearanceList instruments={instruments} />
        <section aria-label="All instruments">
          <SectionHeading end={`${instruments.length} in all`}>All instruments</SectionHeading>
          {instruments.map((instrument) => {
            const { state, words } = stateOf(instrument, today);
            const end = <InstrumentStateLine state={state}>{words}</InstrumentStateLine>;
            return <DeskRow key={instrument.id} {...row(instrument)} end={end} line="" />;
          })}
        </section>
      </Box>
      {opened && (
        <InstrumentDrawer key={opened.id} instrument={opened} onClose={() => setOpenId(undefined)}>
          <ConditionForm instrument={opened} />
          {opened.kind.needsCalibration && <CalibrationForm instrument={opened} />}
        </InstrumentDrawer>
      )}
    </>
  );
}
