import Box from '@mui/material/Box';
import { memo, type ReactNode } from 'react';
import { CautionBox } from '../../../shared-ui/caution-box';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { VerdictLine } from '../../../shared-ui/states/state-line';
import { usePhone } from '../../../shared-ui/use-phone';
import { WindowBar } from '../../../shared-ui/window-bar';
import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { ChartOrTable } from '../results/chart-or-table';
import { BandDrawing } from './band-drawing';
import { HeatDrawing } from './heat-drawing';
import type { JudgedRow, JudgedTable } from './judged';
import { SpurChart, SpurLegend } from './spur-chart';
import type { Shown } from './work';

function Section({ title, end, children }: { title: string; end?: ReactNode; children: ReactNode }) {
  return (
    <Box component="section" aria-label={title} sx={{ mt: '18px' }}>
      <SectionHeading end={end}>{title}</SectionHeading>
      {children}
    </Box>
  );
}

/** On a phone a figure has no head over it, so the head stands beside it. */
function columnsOf({ heads, rows }: JudgedTable, isPhone: boolean): Column<JudgedRow>[] {
  const last = heads.length - 1;
  const hasVerdict = rows.some(({ verdict }) => verdict !== undefined);
  const isPair = heads.length === 2 && !hasVerdict;
  const columns = heads.map((header, index): Column<JudgedRow> => ({
    key: header,
    header,
    align: index === 0 ? 'left' : 'right',
    phone: index === 0 ? 'first' : isPair && index === last ? 'end' : 'second',
    cell: ({ cells }) => {
      const cell = cells[index] ?? '';
      return isPhone && index > 0 && !isPair && cell !== '' ? `${header} ${cell}` : cell;
    },
  }));
  if (!hasVerdict) return columns;
  return [
    ...columns,
    {
      key: 'verdict',
      header: 'Verdict',
      phone: 'end',
      align: 'right',
      cell: ({ verdict }) => verdict && <VerdictLine verdict={verdict} />,
    },
  ];
}

function Rows({ table }: { table: JudgedTable }) {
  const isPhone = usePhone();
  if (table.rows.length === 0)
    return (
      <Box component="p" sx={{ m: 0, pt: '8px', color: 'token.ink2' }}>
        {table.none}
      </Box>
    );
  return (
    <DataTable
      label={table.title}
      columns={columnsOf(table, isPhone)}
      rows={table.rows}
      rowKey={({ cells }) => cells.join(' ')}
    />
  );
}

/** A table, behind its chart where it has one. */
function Table({ table, spurs }: { table: JudgedTable; spurs: Shown['spurs'] }) {
  if (!spurs)
    return (
      <Section title={table.title}>
        <Rows table={table} />
      </Section>
    );
  return (
    <ChartOrTable
      title={table.title}
      legend={<SpurLegend picture={spurs} />}
      chart={
        <>
          <SpurChart picture={spurs} />
          <VisuallyHidden as="div">
            <Rows table={table} />
          </VisuallyHidden>
        </>
      }
      table={<Rows table={table} />}
    />
  );
}

function Picture({ shown: { bar, heat, picture } }: { shown: Shown }) {
  return (
    <>
      {bar && (
        <Section title="Against what it stands" end="dBm, with the room to keep">
          <Box sx={{ pt: '10px' }}>
            <WindowBar
              high={bar.keptUnderDbm}
              reading={{ value: bar.levelDbm, expandedUncertainty: bar.plusMinusDb }}
              tone={bar.levelDbm + bar.plusMinusDb > bar.keptUnderDbm ? 'oxide' : 'green'}
              unit="dBm"
            />
          </Box>
        </Section>
      )}
      {heat && (
        <Section title="The way of the heat">
          <HeatDrawing picture={heat} />
        </Section>
      )}
      {picture && (
        <Section title="What it occupies" end={picture.band && `${picture.band.name} band in green`}>
          <BandDrawing picture={picture} />
        </Section>
      )}
    </>
  );
}

/** Caution, picture, tables, and where the rule comes from. */
export const GuardResults = memo(function GuardResults({ shown }: { shown: Shown }) {
  const { caution, tables, source, spurs } = shown;
  return (
    <>
      <Box sx={{ mt: '14px' }}>
        <CautionBox kind={caution.kind}>{caution.words}</CautionBox>
      </Box>
      <Picture shown={shown} />
      {tables.map((table) => (
        <Table key={table.title} table={table} spurs={spurs} />
      ))}
      <Box component="p" sx={{ m: 0, mt: '14px', typography: 'small', color: 'token.ink2' }}>
        {source}
      </Box>
    </>
  );
});
