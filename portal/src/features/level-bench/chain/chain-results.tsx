import Box from '@mui/material/Box';
import { memo } from 'react';
import { DataTable } from '../../../shared-ui/data-table';
import type { Column } from '../../../shared-ui/data-table-types';
import { LevelDiagram } from '../../../shared-ui/level-diagram/level-diagram';
import { LevelDiagramPhone } from '../../../shared-ui/level-diagram/level-diagram-phone';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { usePhone } from '../../../shared-ui/use-phone';
import { FIGURES, pointsOf, twoToneRows } from './words';
import type { WorkedChain, WorkedStage } from './work';

/** On a phone a figure has no head over it, so its name stands beside it. */
const columnsOf = (isPhone: boolean): Column<WorkedStage>[] => [
  { key: 'name', header: 'After', cell: ({ name }) => name },
  ...FIGURES.map(({ key, header, beside, text }): Column<WorkedStage> => {
    const withName = (stage: WorkedStage) => {
      const figure = text(stage);
      return figure !== '' && beside !== '' ? `${beside} ${figure}` : figure;
    };
    return {
      key,
      header,
      align: 'right',
      phone: key === 'peak' ? 'end' : 'second',
      cell: (stage) =>
        key === 'peak' ? (
          <b>{`${text(stage)}${isPhone ? ' dBm' : ''}`}</b>
        ) : isPhone ? (
          withName(stage)
        ) : (
          text(stage)
        ),
    };
  }),
];

interface ChainResultsProps {
  chain: WorkedChain;
  open: number | undefined;
  onOpen: (index: number) => void;
}

/** Where the level went, the level diagram, every stage's figures, and two tones at the end. Drawn anew only with another result. */
export const ChainResults = memo(function ChainResults({ chain, open, onOpen }: ChainResultsProps) {
  const isPhone = usePhone();
  const Diagram = isPhone ? LevelDiagramPhone : LevelDiagram;
  return (
    <>
      {chain.shortfall && (
        <Box component="section" aria-label="Where the level went" sx={{ mt: '18px' }}>
          <SectionHeading>Where the level went</SectionHeading>
          <Box component="p" sx={{ m: 0, pt: '8px' }}>
            {chain.shortfall}
          </Box>
        </Box>
      )}
      <Box sx={{ mt: '18px' }}>
        {/* On a phone the diagram would scroll to its current row, away from the fields. */}
        <Diagram
          points={pointsOf(chain)}
          currentId={open === undefined || isPhone ? undefined : String(open)}
          onOpen={(id) => onOpen(Number(id))}
        />
      </Box>
      <Box component="section" aria-label="Stage by stage" sx={{ mt: '18px' }}>
        <SectionHeading end="from the input of the chain on">Stage by stage</SectionHeading>
        <DataTable
          label="Stage by stage"
          columns={columnsOf(isPhone)}
          rows={chain.stages}
          rowKey={(stage) => String(chain.stages.indexOf(stage))}
          footer="Noise by Friis. Intercepts add in voltage, the worst case; compression is an estimate. Products: third order of two tones of this PEP, below each tone."
        />
      </Box>
      <Box component="section" aria-label="Two equal tones" sx={{ mt: '18px' }}>
        <SectionHeading end="at the end of the chain, same PEP">Two equal tones</SectionHeading>
        <DataTable
          label="Two equal tones"
          columns={[
            { key: 'name', header: 'Figure', cell: ({ name }) => name },
            { key: 'figure', header: 'Value', cell: ({ figure }) => figure, align: 'right', phone: 'end' },
          ]}
          rows={twoToneRows(chain)}
          rowKey={({ name }) => name}
          footer={
            chain.twoTone
              ? 'Well under compression. Near it the products grow faster.'
              : 'No level of products: no stage has an intercept, or the tones lie at it.'
          }
        />
      </Box>
    </>
  );
});
