import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { carryOut } from '../../../api-client/carry-out';
import { capital, listText } from '../../../lib/text';
import { ConfirmDialog } from '../../../shared-ui/confirm-dialog';
import { DataTable } from '../../../shared-ui/data-table';
import { EmptyState } from '../../../shared-ui/empty-state';
import { TextField } from '../../../shared-ui/fields/text-field';
import { FilterWords } from '../../../shared-ui/filter-words';
import { LoadingBars } from '../../../shared-ui/loading-bars';
import { PageTitle } from '../../../shared-ui/page-title';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { useToast } from '../../../shared-ui/toasts';
import { licencesQuery, useSeeLicence, type Licence } from '../api/licences';
import { peopleQuery } from '../api/people';
import { ClubRules } from '../components/club-rules';
import { OpeningHours } from '../components/opening-hours';
import { LicenceCell } from '../components/licence-cell';
import { PersonCell, RolesCell } from '../components/person-cells';
import { deskRows, lastHolders, rowsShown, SHOWN, shownOptions, type DeskRow } from '../desk';

/** Who may do what: everybody of the club, their roles, and whose licence was seen. */
export default function ClubDeskPage() {
  const people = useQuery(peopleQuery);
  const licences = useQuery(licencesQuery);
  const failed = people.error ?? licences.error;
  const again = () => {
    void people.refetch();
    void licences.refetch();
  };
  return (
    <>
      <PageTitle tab="Club desk">
        Club <b>desk</b>
      </PageTitle>
      {failed ? (
        <ProblemAlert error={failed} onRetry={again} />
      ) : people.data && licences.data ? (
        <>
          <People rows={deskRows(people.data.items, licences.data)} />
          <OpeningHours />
          <ClubRules />
        </>
      ) : (
        <LoadingBars rows={8} label="Loading people" />
      )}
    </>
  );
}

function People({ rows }: { rows: readonly DeskRow[] }) {
  const [search, setSearch] = useSearchParams();
  const name = search.get('name') ?? '';
  const shown = SHOWN.find((known) => known === search.get('shown')) ?? 'everyone';
  const [seeing, setSeeing] = useState<Licence>();
  const put = (key: 'name' | 'shown', text: string) =>
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        after.set(key, text);
        return after;
      },
      { replace: true },
    );
  const found = rowsShown(rows, shown, name.trim());
  return (
    <>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'flex-end', gap: '10px 20px', mb: '14px' }}>
        <Box sx={{ flex: '1 1 auto' }}>
          <FilterWords
            label="Who is shown"
            value={shown}
            options={shownOptions(rows)}
            onChange={(next) => put('shown', next)}
          />
        </Box>
        <Box sx={{ width: { xs: '100%', md: 240 } }}>
          <TextField label="Name" value={name} onChange={(text) => put('name', text)} />
        </Box>
      </Box>
      {found.length === 0 ? (
        <EmptyState title="Nobody of that name here">Clear the name, or show everyone.</EmptyState>
      ) : (
        <DataTable
          label="People, their roles and licences"
          columns={[
            { key: 'name', header: 'Person', cell: PersonCell },
            { key: 'roles', header: 'Roles', cell: RolesCell },
            {
              key: 'licence',
              header: 'Licence seen',
              cell: ({ licences }) => <LicenceCell licences={licences} onSeen={setSeeing} />,
            },
          ]}
          rows={found}
          rowKey={({ person }) => person.id}
          footer={footerText(rows, found)}
        />
      )}
      {seeing && <SeeLicence licence={seeing} onDone={() => setSeeing(undefined)} />}
    </>
  );
}

function footerText(rows: readonly DeskRow[], found: readonly DeskRow[]): string {
  const last = lastHolders(rows);
  const whole = `${rows.length} people, ${found.length} shown.`;
  return last.length === 0
    ? whole
    : `${whole} A role cannot be taken from its last holder: ${capital(listText(last))}.`;
}

/** Asked, for it opens the way on the air and cannot be taken back here. */
function SeeLicence({ licence, onDone }: { licence: Licence; onDone: () => void }) {
  const seeing = useSeeLicence();
  const say = useToast();
  const { buildId, builder, planName } = licence;
  return (
    <ConfirmDialog
      open
      title={`You have seen the licence of ${builder.name}?`}
      act="Licence seen"
      stay="Not yet"
      isBusy={seeing.isPending}
      onStay={onDone}
      onAct={() =>
        carryOut(seeing, buildId, {
          onSuccess: () => {
            say(`Licence of ${builder.name} seen.`);
            onDone();
          },
        })
      }
    >
      It must cover the band, the power and the emission of the {planName}. The last stage opens once
      everything before it is signed off; your name and the day stay in the record. The licence and local
      rules decide what may be sent.
      {seeing.isError && <ProblemAlert error={seeing.error} />}
    </ConfirmDialog>
  );
}
