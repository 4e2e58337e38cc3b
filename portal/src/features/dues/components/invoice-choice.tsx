import Box from '@mui/material/Box';
import { formatAmount } from '../../../lib/money';
import { AssetTag } from '../../../shared-ui/asset-tag';
import type { Invoice } from '../api/dues';
import { dueText } from '../standing';

interface InvoiceChoiceProps {
  invoices: readonly Invoice[];
  chosenId: string;
  onChoose: (invoiceId: string) => void;
}

/** Several invoices make up the sum; one is paid at a time. */
export function InvoiceChoice({ invoices, chosenId, onChoose }: InvoiceChoiceProps) {
  return (
    <Box component="fieldset" sx={{ m: '14px 0 0', p: 0, border: 0, minWidth: 0 }}>
      <Box component="legend" sx={{ p: 0, typography: 'label', color: 'token.ink2' }}>
        It is made up of {invoices.length} invoices. Pay one now
      </Box>
      {invoices.map(({ id, number, description, openMinor, ...due }) => (
        <Box
          component="label"
          key={id}
          sx={{
            display: 'flex',
            alignItems: 'center',
            gap: '10px',
            minHeight: 44,
            borderBottom: '1px solid',
            borderColor: 'token.rule',
            cursor: 'pointer',
          }}
        >
          <Box
            component="input"
            type="radio"
            name="invoice"
            checked={id === chosenId}
            onChange={() => onChoose(id)}
            sx={{ width: 18, height: 18, m: 0, accentColor: 'var(--fr-palette-token-green)' }}
          />
          <AssetTag>{number}</AssetTag>
          <Box sx={{ flex: 1, minWidth: 0 }}>
            {description}.{' '}
            <Box component="span" sx={{ color: 'token.ink2' }}>
              {dueText(due)}
            </Box>
          </Box>
          <b>{formatAmount(openMinor)}</b>
        </Box>
      ))}
    </Box>
  );
}
