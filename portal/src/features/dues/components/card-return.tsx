import Box from '@mui/material/Box';
import Link from '@mui/material/Link';
import { useQueryClient } from '@tanstack/react-query';
import { useEffect, type ReactNode } from 'react';
import { Banner } from '../../../shared-ui/banner';
import { ProblemAlert } from '../../../shared-ui/problem-alert';
import { StateMark } from '../../../shared-ui/states/shape';
import { DUES_KEY, useCardCheck, useCardPayment } from '../api/dues';

interface CardReturnProps {
  invoiceId: string;
  /** Came back after paying, or left the card page without. */
  how: 'returned' | 'left';
  onReceipt: (paymentId: string) => void;
  onDone: () => void;
}

/** Back from the card page: says that it is checking, then what became of it, in plain words. */
export function CardReturn({ invoiceId, how, onReceipt, onDone }: CardReturnProps) {
  const query = useCardPayment(invoiceId);
  const client = useQueryClient();
  const check = useCardCheck(invoiceId);
  const { isGivenUp } = query;
  const { isIdle, mutate: ask } = check;
  useEffect(() => {
    if (isGivenUp && isIdle) ask();
  }, [isGivenUp, isIdle, ask]);
  const { state, receiptId } = query.data ?? {};
  useEffect(() => {
    if (state === 'paid') void client.invalidateQueries({ queryKey: DUES_KEY, predicate: isOverview });
  }, [state, client]);
  const close = (
    <Link component="button" onClick={onDone}>
      Close
    </Link>
  );
  if (query.isError) return <ProblemAlert error={query.error} onRetry={() => void query.refetch()} />;
  if (state === 'paid' && receiptId)
    return (
      <Good title="Paid by card.">
        <Link component="button" onClick={() => onReceipt(receiptId)}>
          See the receipt
        </Link>
        . {close}
      </Good>
    );
  if (state === 'failed' || state === 'expired' || state === 'none')
    return (
      <Banner kind="failed" title="Not paid." action={close}>
        The card was not charged. Try again, or pay by transfer.
      </Banner>
    );
  if (how === 'left' && state === 'open')
    return (
      <Banner kind="not allowed" title="Not paid yet." action={close}>
        You left the card page. Nothing was taken.
      </Banner>
    );
  if (isGivenUp && (check.isSuccess || check.isError))
    return (
      <StillUnknown
        isConfirming={state === 'confirming'}
        isSilent={check.isError}
        onAgain={() => ask()}
        close={close}
      />
    );
  return <Checking isConfirming={state === 'confirming'} />;
}

/** The lists, not the question that is being asked. */
const isOverview = ({ queryKey }: { queryKey: readonly unknown[] }): boolean =>
  queryKey[1] !== 'card-payment';

function Checking({ isConfirming }: { isConfirming: boolean }) {
  return (
    <Note shape="half" colour="trace" title="Checking.">
      No money is taken twice. {isConfirming && 'Your bank has yet to confirm the payment.'}
    </Note>
  );
}

interface StillUnknownProps {
  isConfirming: boolean;
  /** The card service could not be asked. */
  isSilent: boolean;
  onAgain: () => void;
  close: ReactNode;
}

/** The card service was asked and does not say either: nothing more is asked until the person wants it. */
function StillUnknown({ isConfirming, isSilent, onAgain, close }: StillUnknownProps) {
  return (
    <Note
      shape="half"
      colour="trace"
      title={isConfirming ? 'Your bank has yet to confirm.' : 'Not known yet.'}
    >
      {isSilent
        ? 'The card service does not answer just now. '
        : isConfirming
          ? 'That may take a day. '
          : 'The card service has no payment for this invoice yet. '}
      No money is taken twice. If it was paid, the receipt comes by mail; you can leave this page.{' '}
      <Link component="button" onClick={onAgain}>
        Try again
      </Link>
      . {close}
    </Note>
  );
}

const Good = ({ title, children }: { title: string; children: ReactNode }) => (
  <Note shape="tick" colour="green" title={title}>
    {children}
  </Note>
);

interface NoteProps {
  shape: 'half' | 'tick';
  colour: 'trace' | 'green';
  title: string;
  children: ReactNode;
}

function Note({ shape, colour, title, children }: NoteProps) {
  return (
    <Box
      role="status"
      sx={{
        display: 'grid',
        gridTemplateColumns: '20px 1fr',
        gap: '10px',
        p: '11px 16px',
        border: '1px solid',
        borderColor: `token.${colour}`,
        borderRadius: '3px',
        backgroundColor: `token.${colour}Tint`,
      }}
    >
      <Box sx={{ color: `token.${colour}`, pt: '2px' }}>
        <StateMark name={shape} size={17} />
      </Box>
      <div>
        <b>{title}</b> {children}
      </div>
    </Box>
  );
}
