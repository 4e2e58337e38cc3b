import Button from '@mui/material/Button';
import { useId, useState } from 'react';
import type { ReactNode } from 'react';
import { VisuallyHidden } from './visually-hidden';

interface WaitingButtonProps {
  /** What it will do and what is missing: "Send to mentor, 3 checks left". */
  children: ReactNode;
  /** A longer reason, read out with the button and said again when it is pressed. */
  reason?: string;
  /** What a press does all the same: to point at what is missing. */
  onPress?: () => void;
  fullWidth?: boolean;
  size?: 'small' | 'medium';
}

/** A button that is not available yet: dashed, still focusable, and it says what is missing. */
export function WaitingButton({ children, reason, onPress, fullWidth, size }: WaitingButtonProps) {
  const id = useId();
  const [presses, setPresses] = useState(0);
  return (
    <>
      <Button
        aria-disabled="true"
        aria-describedby={reason ? id : undefined}
        fullWidth={fullWidth}
        size={size}
        onClick={() => {
          setPresses(presses + 1);
          onPress?.();
        }}
        sx={{
          '&, &:hover': {
            borderStyle: 'dashed',
            borderColor: 'token.edge',
            color: 'token.ink3',
            backgroundColor: 'transparent',
            cursor: 'default',
          },
        }}
      >
        {children}
      </Button>
      {reason && (
        <VisuallyHidden>
          <span id={id}>{reason}</span>
        </VisuallyHidden>
      )}
      {presses > 0 && (
        <VisuallyHidden>
          <span role="status" key={presses}>
            {reason ?? children}
          </span>
        </VisuallyHidden>
      )}
    </>
  );
}
