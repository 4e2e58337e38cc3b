import Box from '@mui/material/Box';
import type { ReactNode } from 'react';
import { SectionHeading } from '../../../shared-ui/section-heading';
import type { BuildCheck, BuildStage, Reading } from '../api/builds';
import { CheckRow } from './check-row';
import { RecordLines } from './record-lines';

interface ChecklistProps {
  stage: BuildStage;
  /** The check whose form stands in the list, and the form. */
  openId?: string;
  open?: ReactNode;
  /** What a gain would come to with the level being typed. */
  previewOf?: (
    check: BuildCheck,
  ) => Pick<Reading, 'value' | 'unit' | 'uncertaintyUnit' | 'expandedUncertainty'> | undefined;
  onOpen?: (checkId: string) => void;
  /** Every row with its tries, photos and names: for a record that is closed. */
  isRecord?: boolean;
}

/** A stage's checks in order, exactly one of them open while the stage is in its builder's hands. */
export function Checklist({ stage, openId, open, previewOf, onOpen, isRecord = false }: ChecklistProps) {
  const { checks, settled } = stage;
  return (
    <Box component="section" aria-labelledby="checklist">
      <SectionHeading id="checklist" end={`${settled} of ${checks.length} done`}>
        Checklist
      </SectionHeading>
      <Box component="ul" sx={{ m: 0, p: 0, listStyle: 'none' }}>
        {checks.map((check) =>
          check.id === openId && open ? (
            <li key={check.id}>{open}</li>
          ) : (
            <CheckRow
              key={check.id}
              check={check}
              stage={stage}
              preview={previewOf?.(check)}
              onOpen={onOpen && check.kind !== "mentor's eyes" ? () => onOpen(check.id) : undefined}
            >
              {isRecord && <RecordLines check={check} />}
            </CheckRow>
          ),
        )}
      </Box>
    </Box>
  );
}
