import type { CSSProperties, ReactNode } from 'react';

const HIDDEN: CSSProperties = {
  position: 'absolute',
  width: 1,
  height: 1,
  margin: -1,
  padding: 0,
  overflow: 'hidden',
  clip: 'rect(0 0 0 0)',
  whiteSpace: 'nowrap',
  border: 0,
};

interface VisuallyHiddenProps {
  children: ReactNode;
  /** `div` for a whole table or list. */
  as?: 'span' | 'div';
}

/** Read aloud, not shown. */
export function VisuallyHidden({ children, as: Element = 'span' }: VisuallyHiddenProps) {
  return <Element style={HIDDEN}>{children}</Element>;
}
