import Typography from '@mui/material/Typography';
import { memo } from 'react';
import { CautionBox } from '../../../shared-ui/caution-box';
import { usePhone } from '../../../shared-ui/use-phone';
import type { FilterBuilds } from './builds';
import type { FilterFigures } from './figures';
import { tightest, type Judged } from './judged';
import { LimitTable } from './limit-table';
import { PartsTable } from './parts-table';
import { ResponseSection } from './response-section';
import { Schematic } from './schematic';
import { SpreadHistogram } from './spread-histogram';
import { neededWords } from './words';

interface FilterResultsProps {
  figures: FilterFigures;
  judged: Judged;
  built: FilterBuilds | undefined;
  isStale: boolean;
}

/** Circuit, response and spread; drawn anew when the filter changes, not at every key. */
export const FilterResults = memo(function FilterResults({
  figures,
  judged,
  built,
  isStale,
}: FilterResultsProps) {
  const isPhone = usePhone();
  const least = tightest(judged.limits);
  return (
    <>
      <Schematic ladder={figures.fitted} />
      <ResponseSection {...{ figures, judged, built, isStale }}>
        {isPhone && <LimitTable limits={judged.limits} />}
        {least && <SpreadHistogram limit={least} />}
        {!isPhone && <LimitTable limits={judged.limits} />}
        <Typography variant="small" component="p" sx={{ m: 0, color: 'token.ink2' }}>
          {neededWords(figures)}
        </Typography>
        <CautionBox kind="load before power" name="Your licence and local rules decide.">
          <b>Measure it</b> into a dummy load before On the air.
        </CautionBox>
        {isPhone && (
          <PartsTable
            ladder={figures.fitted}
            toleranceRel={figures.values.toleranceRel}
            trimmed={figures.values.kind === 'band-pass' ? figures.values.trimmed : undefined}
          />
        )}
      </ResponseSection>
    </>
  );
});
