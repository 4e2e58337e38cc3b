import type { ReactNode } from 'react';

interface ShapeProps {
  /** Pixels; shapes are drawn on a 16 grid. */
  size?: number;
  /** Read aloud when the shape stands alone; beside its word leave it out. */
  label?: string;
}

/** A state's mark. Its colour is that of the text around it. */
function Shape({ size = 16, label, children }: ShapeProps & { children: ReactNode }) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth={1.4}
      strokeLinecap="round"
      strokeLinejoin="round"
      style={{ flex: 'none' }}
      {...(label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true })}
    >
      {children}
    </svg>
  );
}

const SHAPES = {
  /** Filled disc with a tick: good and settled. */
  tick: (
    <>
      <circle cx="8" cy="8" r="6.4" fill="currentColor" stroke="none" />
      <path d="M5.1 8.2l2 2 3.8-4.2" stroke="var(--fr-palette-token-paper)" strokeWidth="1.6" />
    </>
  ),
  /** Half-filled ring: in someone else's hands. */
  half: (
    <>
      <circle cx="8" cy="8" r="5.7" />
      <path d="M8 2.3a5.7 5.7 0 0 1 0 11.4z" fill="currentColor" stroke="none" />
    </>
  ),
  /** Right-pointing flag: here now. */
  flag: <path d="M4.2 2.8v10.4L13 8z" fill="currentColor" stroke="none" />,
  /** Return arrow: sent back. */
  back: <path d="M5.6 3.4L2.6 6.2l3 2.8M2.9 6.2h6.8a3.3 3.3 0 0 1 0 6.6H7" />,
  ring: <circle cx="8" cy="8" r="5.4" strokeWidth="1.3" />,
  padlock: (
    <>
      <rect x="3.4" y="7" width="9.2" height="6.6" rx="1" fill="currentColor" stroke="none" />
      <path d="M5.4 7V5.2a2.6 2.6 0 0 1 5.2 0V7" />
    </>
  ),
  /** Diamond with a wave: cannot be told apart. */
  diamond: (
    <>
      <path d="M8 1.6L14.4 8 8 14.4 1.6 8z" />
      <path d="M5.2 8.3c.9-1.2 1.9-1.2 2.8-.3s1.9.9 2.8-.3" strokeWidth="1.3" />
    </>
  ),
  /** Square with a bar: short of the window. */
  square: (
    <>
      <rect x="2.4" y="2.4" width="11.2" height="11.2" rx="1" />
      <path d="M5.4 8h5.2" />
    </>
  ),
  octagon: (
    <>
      <path d="M5.5 2h5L14 5.5v5L10.5 14h-5L2 10.5v-5z" />
      <path d="M8 4.9v3.6M8 11v.1" strokeWidth="1.6" />
    </>
  ),
  /** A pennant on its staff: needs you. */
  pennant: <path d="M3.4 14.2V2.2h9.8l-2.4 3.3 2.4 3.3H4.6v5.4z" fill="currentColor" stroke="none" />,
} as const;

export type ShapeName = keyof typeof SHAPES;

export function StateMark({ name, ...rest }: ShapeProps & { name: ShapeName }) {
  return <Shape {...rest}>{SHAPES[name]}</Shape>;
}
