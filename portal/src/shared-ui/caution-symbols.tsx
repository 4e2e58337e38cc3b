import type { ReactNode } from 'react';

/** The six cautions of the workshop, drawn on a 24 grid. */
export const CAUTION_SYMBOLS: Record<CautionKind, ReactNode> = {
  'load before power': <path d="M12 3.5L21 19.5H3zM12 9.5v5M12 17v.1" />,
  'hot parts': (
    <>
      <path d="M12 3L21.5 19.5h-19z" />
      <path d="M7.5 17h9M9.3 14.8c-.8-1 .8-1.7 0-2.8M12 14.8c-.8-1.2.8-2.2 0-3.6M14.7 14.8c-.8-1 .8-1.7 0-2.8" />
    </>
  ),
  'RF power': (
    <>
      <path d="M12 10.5V20.5M9.5 20.5h5M12 10.5v.1" strokeWidth="2" />
      <path d="M9.3 13a3.6 3.6 0 0 1 0-5.2M14.7 7.8a3.6 3.6 0 0 1 0 5.2M6.5 15.5a7.2 7.2 0 0 1 0-10.3M17.5 5.2a7.2 7.2 0 0 1 0 10.3" />
    </>
  ),
  'mains and high voltage': (
    <>
      <path d="M12 3L21.5 19.5h-19z" />
      <path d="M12.8 8.5L10.3 13h3.4l-2.5 4.3" />
    </>
  ),
  'RF exposure': (
    <>
      <circle cx="7" cy="5.5" r="2" />
      <path d="M7 8v6M7 14l-2.5 6M7 14l2.5 6M3.5 11.5L7 9.5l3.5 2M13.5 8.5a5 5 0 0 1 0 7M16.3 6.2a8.5 8.5 0 0 1 0 11.6M19 4.2a12 12 0 0 1 0 15.6" />
    </>
  ),
  'licence needed': (
    <>
      <rect x="3" y="5" width="18" height="14" rx="1" />
      <circle cx="8.5" cy="10.5" r="2" />
      <path d="M5.5 16c.3-1.7 1.4-2.6 3-2.6s2.7.9 3 2.6M14.5 10h4M14.5 14h4" />
    </>
  ),
};

export type CautionKind =
  | 'load before power'
  | 'hot parts'
  | 'RF power'
  | 'mains and high voltage'
  | 'RF exposure'
  | 'licence needed';
