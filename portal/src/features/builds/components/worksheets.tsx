import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Link from '@mui/material/Link';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { formatInClubZone } from '../../../lib/club-time-text';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { SectionHeading } from '../../../shared-ui/section-heading';
import { useTakeBackWorksheet, worksheetsQuery, type Worksheet } from '../api/worksheets';

interface WorksheetsProps {
  buildId: string;
  stageId: string;
  /** The builder may take one back. */
  isOwn: boolean;
}

/** Calculations the builder put on a stage; nothing stands there while there are none. */
export function Worksheets({ buildId, stageId, isOwn }: WorksheetsProps) {
  const found = useQuery(worksheetsQuery(buildId));
  const takingBack = useTakeBackWorksheet(buildId);
  const sheets = (found.data ?? []).filter((sheet) => sheet.stageId === stageId);
  if (found.isError) return <ProblemAlert error={found.error} onRetry={() => void found.refetch()} />;
  if (sheets.length === 0) return null;
  return (
    <Box component="section" aria-label="From the level bench" sx={{ mt: '24px' }}>
      <SectionHeading>From the level bench</SectionHeading>
      {takingBack.isError && <ProblemAlert error={takingBack.error} title="It still stands there." />}
      {sheets.map((sheet) => (
        <Sheet
          key={sheet.id}
          sheet={sheet}
          onTakeBack={isOwn ? () => takingBack.mutate(sheet.id) : undefined}
        />
      ))}
    </Box>
  );
}

function Sheet({ sheet, onTakeBack }: { sheet: Worksheet; onTakeBack?: () => void }) {
  const { family, inputs, result, at } = sheet;
  return (
    <Box sx={{ py: '10px', borderBottom: '1px solid', borderColor: 'token.rule' }}>
      <Box sx={{ whiteSpace: 'pre-wrap', overflowWrap: 'anywhere' }}>{result}</Box>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '4px 14px', mt: '4px' }}>
        <Box component="span" sx={{ typography: 'small', color: 'token.ink2' }}>
          {formatInClubZone(at)}
        </Box>
        <Link component={RouterLink} to={`/level-bench/${family}${inputs && `?${inputs}`}`}>
          Open it again
        </Link>
        {onTakeBack && (
          <Button size="small" onClick={onTakeBack}>
            Take it back
          </Button>
        )}
      </Box>
    </Box>
  );
}
