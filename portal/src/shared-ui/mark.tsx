import { token } from './tokens';

/** The product's mark: three cores on a bench line, the middle one wound. Follows the theme, from 32 px up. */
export function Mark({ width = 42 }: { width?: number }) {
  return (
    <svg
      width={width}
      height={(width * 40) / 52}
      viewBox="0 0 52 40"
      fill="none"
      aria-hidden
      style={{ flex: 'none' }}
    >
      <g stroke={token('ink')}>
        <path d="M1 34.5h50" strokeWidth="1.5" />
        <g strokeWidth="3.2">
          <circle cx="10" cy="21" r="7.2" />
          <circle cx="42" cy="21" r="7.2" />
        </g>
      </g>
      <circle cx="26" cy="21" r="7.2" strokeWidth="5.4" stroke={token('green')} />
      <path
        d="M20.6 12.3l3.3 5M26 10.5v6M31.4 12.3l-3.3 5M17 17.5l5 2M35 17.5l-5 2"
        stroke={token('copper')}
        strokeWidth="1.9"
        strokeLinecap="round"
      />
    </svg>
  );
}
