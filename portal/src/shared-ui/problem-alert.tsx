import Button from '@mui/material/Button';
import type { ReactNode } from 'react';
import { failureOf } from '../lib/failure';
import { Banner } from './banner';

const BANNERS = {
  'no-connection': 'no connection',
  'not-allowed': 'not allowed',
  gone: 'failed',
  failed: 'failed',
} as const;

interface ProblemAlertProps {
  error: unknown;
  /** Shows "Try again"; leave out where trying again cannot help. */
  onRetry?: () => void;
  /** What happened in the words of this place, in front of the API's own: "The booking was not made." */
  title?: string;
  /** What was kept and what to do next. */
  children?: ReactNode;
}

/** A refused or failed request, in the place where its content would be. */
export function ProblemAlert({ error, onRetry, title, children }: ProblemAlertProps) {
  const failure = failureOf(error);
  const retry = onRetry && failure.kind !== 'not-allowed' && (
    <Button size="small" onClick={onRetry}>
      Try again
    </Button>
  );
  return (
    <Banner kind={BANNERS[failure.kind]} title={title ?? `${failure.title}.`} action={retry}>
      {failure.detail} {children}
    </Banner>
  );
}
