import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { dayText } from '../../../lib/club-time-text';
import { SelectField } from '../../../shared-ui/fields/select-field';
import { TextField } from '../../../shared-ui/fields/text-field';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { StateMark } from '../../../shared-ui/states/shape';
import { WaitingButton } from '../../../shared-ui/waiting-button';
import type { StatementDetail, StatementLine } from '../api/treasury';
import { faultOf, sentenceOf, sumOf, type Choice } from '../settling';

interface LinePanelProps {
  line: StatementLine;
  detail: Pick<StatementDetail, 'currency' | 'accounts'>;
  choice: Choice;
  onChoice: (choice: Partial<Choice>) => void;
  onAccept: () => void;
  onTakeBack: () => void;
  isBusy: boolean;
  error: unknown;
}

/** The opened line: what it pays, why, and what to do with it. */
export function LinePanel(props: LinePanelProps) {
  const { line, detail, choice, isBusy, error, onAccept, onTakeBack } = props;
  const isMatched = line.state === 'matched';
  const fault = faultOf(line, choice);
  return (
    <Box
      component="section"
      aria-label="The opened line"
      sx={{
        mt: '14px',
        p: '12px 18px',
        border: '1.5px solid',
        borderColor: 'token.ink',
        borderRadius: '3px',
        backgroundColor: 'token.sheet',
      }}
    >
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '10px 24px' }}>
        <Box sx={{ flex: '1 1 280px', minWidth: 0 }}>
          <Typography variant="h2">
            {dayText(line.day).slice(4)}, {sentenceOf(line, isMatched ? [] : choice.items, detail.currency)}
          </Typography>
          <Reasons line={line} sum={isMatched ? undefined : sumOf(line, choice.items)} />
        </Box>
        {!isMatched && <AccountChoice {...props} />}
        {isMatched && (
          <Button loading={isBusy} onClick={onTakeBack}>
            Take back
          </Button>
        )}
        {!isMatched && fault && <WaitingButton>Accept match, {fault}</WaitingButton>}
        {!isMatched && !fault && (
          <Button variant="contained" loading={isBusy} onClick={onAccept}>
            Accept match
          </Button>
        )}
      </Box>
      {error !== null && error !== undefined && (
        <Box sx={{ mt: '12px' }}>
          <ProblemAlert error={error} />
        </Box>
      )}
    </Box>
  );
}

function Reasons({ line, sum }: { line: StatementLine; sum: string | undefined }) {
  const shape = line.state === 'matched' ? 'tick' : 'ring';
  return (
    <Box
      component="ul"
      sx={{ display: 'flex', flexWrap: 'wrap', gap: '2px 20px', m: '4px 0 0', p: 0, listStyle: 'none' }}
    >
      {[...line.reasons, ...(sum ? [sum] : [])].map((reason) => (
        <Box
          component="li"
          key={reason}
          sx={{ display: 'flex', alignItems: 'center', gap: '7px', typography: 'small' }}
        >
          <StateMark name={reason === sum ? 'tick' : shape} size={12} />
          {reason}
        </Box>
      ))}
    </Box>
  );
}

function AccountChoice({ detail, choice, onChoice }: LinePanelProps) {
  return (
    <Box
      sx={{
        flex: '0 1 auto',
        display: 'grid',
        gridTemplateColumns: { sm: choice.accountCode === '' ? '260px' : '220px 220px' },
        gap: '12px',
        width: { xs: '100%', md: 'auto' },
      }}
    >
      <SelectField
        label="Or it pays no invoice: settle it against"
        value={choice.accountCode}
        onChange={(accountCode) => onChoice({ accountCode })}
        options={[
          { value: '', label: 'No account' },
          ...detail.accounts.map(({ code, name }) => ({ value: code, label: `${code} ${name}` })),
        ]}
      />
      {choice.accountCode !== '' && (
        <TextField
          label="What it was, for the books"
          value={choice.note}
          onChange={(note) => onChoice({ note })}
          maxLength={200}
        />
      )}
    </Box>
  );
}
