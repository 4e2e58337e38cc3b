import type { ReactNode } from 'react';

const PATHS = {
  tonight: (
    <>
      <circle cx="12" cy="13.5" r="7.5" />
      <path d="M12 13.5l3.2 2.2M9.5 3.2h5M12 3.2V6" />
    </>
  ),
  build: (
    <>
      <rect x="3.5" y="5" width="17" height="12" rx="1" />
      <path d="M7 9h5v4H7zM15 9h2.5M15 12h2.5M7 17v2.8M10.3 17v2.8M13.7 17v2.8M17 17v2.8" />
    </>
  ),
  benchBook: (
    <>
      <rect x="3.5" y="5.5" width="17" height="14.5" rx="1" />
      <path d="M3.5 10h17M9.2 10v10M14.8 10v10M8 3v4M16 3v4" />
    </>
  ),
  buildNights: <path d="M19.5 14.5A8 8 0 0 1 9.5 4.5a8 8 0 1 0 10 10z" />,
  groups: (
    <>
      <circle cx="9" cy="8" r="3.3" />
      <path d="M2.8 19.5c0-3.6 2.7-6 6.2-6s6.2 2.4 6.2 6M15.5 4.9a3.3 3.3 0 0 1 0 6.2M17.5 13.9c2.3.7 3.7 2.7 3.7 5.6" />
    </>
  ),
  instruments: (
    <>
      <rect x="3" y="5" width="18" height="14" rx="1" />
      <path d="M6 14.5c1.2 0 1.2-6 2.4-6s1.2 6 2.4 6 1.2-6 2.4-6 1 3 1.2 4" />
      <circle cx="17.5" cy="15.5" r=".8" fill="currentColor" />
    </>
  ),
  levelBench: <path d="M3 20.5h18M3 16.5h5v-6h5v3h3v-9h5" />,
  dues: (
    <>
      <circle cx="12" cy="12" r="8.5" />
      <path d="M15 8.6c-.5-1.1-1.4-1.6-2.6-1.6-1.7 0-2.6 1.2-2.6 2.9V13c0 1.6-.3 2.7-1.3 3.6h6.8M8.5 12.4h4.6" />
    </>
  ),
  review: (
    <>
      <path d="M6 3.5h8.5L19 8v12.5H6z" />
      <path d="M9 13.5l2.3 2.3 4.2-4.6" />
    </>
  ),
  treasury: <path d="M3.5 9.5L12 4l8.5 5.5zM5.5 9.5v8M10 9.5v8M14 9.5v8M18.5 9.5v8M3.5 20h17" />,
  clubDesk: (
    <>
      <path d="M3.5 8h8M16.5 8h4M3.5 16h3M11.5 16h9" />
      <circle cx="14" cy="8" r="2.3" />
      <circle cx="9" cy="16" r="2.3" />
    </>
  ),
  more: (
    <>
      <circle cx="5.5" cy="12" r="1.5" fill="currentColor" stroke="none" />
      <circle cx="12" cy="12" r="1.5" fill="currentColor" stroke="none" />
      <circle cx="18.5" cy="12" r="1.5" fill="currentColor" stroke="none" />
    </>
  ),
  check: <path d="M4.5 12.5l5 5 10-11" />,
  close: <path d="M5.5 5.5l13 13M18.5 5.5l-13 13" />,
  back: <path d="M14.5 5L7.5 12l7 7" />,
  forward: <path d="M9.5 5l7 7-7 7" />,
  arrow: <path d="M4 12h15.5M13 5.5l6.5 6.5-6.5 6.5" />,
  down: <path d="M5 9l7 7 7-7" />,
  up: <path d="M5 15l7-7 7 7" />,
  plus: <path d="M12 4.5v15M4.5 12h15" />,
  filter: <path d="M4 7h16M7 12h10M10 17h4" />,
  search: (
    <>
      <circle cx="10.5" cy="10.5" r="6" />
      <path d="M15 15l5.5 5.5" />
    </>
  ),
  eye: (
    <>
      <path d="M2.5 12S6 5.8 12 5.8 21.5 12 21.5 12 18 18.2 12 18.2 2.5 12 2.5 12z" />
      <circle cx="12" cy="12" r="2.8" />
    </>
  ),
  eyeShut: (
    <>
      <path d="M2.5 12S6 5.8 12 5.8 21.5 12 21.5 12 18 18.2 12 18.2 2.5 12 2.5 12z" />
      <path d="M4.5 4.5l15 15" />
    </>
  ),
  table: (
    <>
      <rect x="3.5" y="5" width="17" height="14" rx="1" />
      <path d="M3.5 9.7h17M3.5 14.3h17M10 5v14" />
    </>
  ),
  print: <path d="M7 9V4h10v5M7 17H4V9h16v8h-3M7 14h10v6H7z" />,
  camera: (
    <>
      <path d="M3.5 7.5h4L9 5h6l1.5 2.5h4v11.5h-17z" />
      <circle cx="12" cy="13" r="3.5" />
    </>
  ),
  copy: <path d="M8.5 8.5v-4h11v11h-4M4.5 8.5h11v11h-11z" />,
  signOut: <path d="M10 4.5H4.5v15H10M9.5 12H20M15.5 7.5L20 12l-4.5 4.5" />,
  noConnection: <path d="M4 4l16 16M6.5 8.5l2.2 4.3 2.8-.8-.5 4M13 5l2.5 4.5 3-1-.5 5.5M10 19.5h.1" />,
  lock: (
    <>
      <rect x="5" y="10.5" width="14" height="10" rx="1" />
      <path d="M8 10.5V7.5a4 4 0 0 1 8 0v3" />
    </>
  ),
} as const;

export type IconName = keyof typeof PATHS;

interface IconProps {
  name: IconName;
  size?: number;
}

/** A drawn line icon on a 24 grid, in the colour of the text; decoration, so its control needs words of its own. */
export function Icon({ name, size = 20 }: IconProps): ReactNode {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 24 24"
      fill="none"
      stroke="currentColor"
      strokeWidth={1.7}
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden
      style={{ flex: 'none' }}
    >
      {PATHS[name]}
    </svg>
  );
}
