import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { clubDay } from '../../../lib/club-time';
import { AssetTag } from '../../../shared-ui/asset-tag';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { EmptyState } from '../../../shared-ui/empty-state';
import { TextField } from '../../../shared-ui/fields/text-field';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { InstrumentStateLine } from '../../../shared-ui/states/state-line';
import { instrumentListQuery, type Instrument } from '../api/instruments';
import { InstrumentDrawer } from '../components/instrument-drawer';
import { damageWords } from '../../../lib/text';
import { calibrationWords, clearanceWords, stateOf } from '../instrument-words';

function StateCell({ instrument }: { instrument: Instrument }) {
  const { state, words } = stateOf(instrument, clubDay());
  return <InstrumentStateLine state={state}>{words}</InstrumentStateLine>;
}

const COLUMNS: readonly Column<Instrument>[] = [
  {
    key: 'name',
    header: 'Instrument',
    cell: ({ tag, name }) => (
      <Box component="span" sx={{ display: 'inline-flex', gap: '12px', alignItems: 'center' }}>
        <AssetTag>{tag}</AssetTag> {name}
      </Box>
    ),
  },
  {
    key: 'state',
    header: 'State',
    cell: (instrument) => <StateCell instrument={instrument} />,
    phone: 'second',
  },
  { key: 'clearance', header: 'Your clearance', cell: clearanceWords },
  { key: 'calibration', header: 'Calibration', cell: calibrationWords },
  {
    key: 'damage',
    header: 'Harmed above',
    align: 'right',
    cell: ({ damageLevelDbm }) => damageWords(damageLevelDbm),
    phone: 'hidden',
  },
];

export default function InstrumentsPage() {
  const [params, setParams] = useSearchParams();
  const list = useQuery(instrumentListQuery);
  const [words, openTag] = [params.get('search') ?? '', params.get('open')];
  const change = (name: string, value: string) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        if (value) after.set(name, value);
        else after.delete(name);
        return after;
      },
      { replace: true, preventScrollReset: true },
    );
  const matches = ({ tag, name, kind }: Instrument) =>
    `${tag} ${name} ${kind.name}`.toLowerCase().includes(words.trim().toLowerCase());
  const shown = list.data?.filter(matches) ?? [];
  const opened = list.data?.find(({ tag }) => tag === openTag);
  return (
    <>
      <PageTitle tab="Instruments">
        <b>Instruments</b>
      </PageTitle>
      {list.isPending && <LoadingBars rows={10} label="Loading instruments" />}
      {list.isError && <ProblemAlert error={list.error} onRetry={() => void list.refetch()} />}
      {list.data && (
        <>
          <Box sx={{ maxWidth: 340, mb: '14px' }}>
            <TextField
              label="Search by tag or name"
              type="search"
              value={words}
              onChange={(text) => change('search', text)}
            />
          </Box>
          {shown.length === 0 ? (
            <EmptyState
              title="No instrument matches"
              action={words && <Button onClick={() => change('search', '')}>Clear the search</Button>}
            />
          ) : (
            <DataTable
              label="Instruments"
              columns={COLUMNS}
              rows={shown}
              rowKey={({ tag }) => tag}
              openKey={opened?.tag}
              onOpen={({ tag }) => change('open', tag)}
              footer={`${list.data.length} instruments, ${shown.length} shown`}
            />
          )}
        </>
      )}
      {opened && <InstrumentDrawer instrument={opened} onClose={() => change('open', '')} />}
    </>
  );
}
