import type { AmateurBand } from '@ferrite-row/levels';
import { memo } from 'react';
import { fixed } from '../../../lib/text';
import { token } from '../../../shared-ui/tokens';
import { bandMarks, bandWidth } from './band-marks';
import { figuresOf, gridOf, type Scale } from './scale';

interface ChartAxesProps {
  scale: Scale;
  bands: readonly AmateurBand[];
  /** The one that is wanted. */
  band: AmateurBand;
  hasFilter: boolean;
}

const BANDS_Y = 19;
const FIGURES_Y = 35;

/** Grid, figures at both sides and the bands under the axis. */
export const ChartAxes = memo(function ChartAxes({ scale, bands, band, hasFilter }: ChartAxesProps) {
  const { left, right, top, bottom, x, y, isPhone, topDbm } = scale;
  const figures = figuresOf(scale);
  const hasRight = hasFilter && !isPhone;
  return (
    <g fontSize="10.5" fontWeight="600" fill={token('ink2')}>
      <path
        d={[
          ...gridOf(scale).map((dbm) => `M${left} ${y(dbm)}H${right}`),
          ...figures.map((hertz) => `M${x(hertz)} ${top}V${bottom}`),
        ].join('')}
        stroke={token('rule')}
      />
      <g textAnchor="end">
        <text x={left - 8} y={top - 13} fill={token('ink2')}>
          dBm
        </text>
        {gridOf(scale).map((dbm) => (
          <text key={dbm} x={left - 8} y={y(dbm) + 4} fontWeight="700">
            {fixed(dbm, 0)}
          </text>
        ))}
        <text x={left - 14} y={bottom + BANDS_Y}>
          Bands, m
        </text>
        <text x={left - 14} y={bottom + FIGURES_Y}>
          MHz
        </text>
      </g>
      {hasRight && (
        <g fill={token('green')} fontWeight="700">
          <text x={right + 40} y={top - 13} textAnchor="end">
            Filter, dB
          </text>
          {gridOf(scale).map((dbm) => (
            <text key={dbm} x={right + 8} y={y(dbm) + 4}>
              {fixed(dbm - topDbm, 0)}
            </text>
          ))}
        </g>
      )}
      <g textAnchor="middle" fontWeight="700">
        {figures.map((hertz) => (
          <text key={hertz} x={x(hertz)} y={bottom + FIGURES_Y} fill={token('ink')}>
            {fixed(hertz / 1e6, 0)}
          </text>
        ))}
        {bandMarks(bands, band, scale).map(({ name, at, width, isWanted, isNamed }) => (
          <g key={`${name} ${at}`} fill={isWanted ? token('green') : token('ink2')}>
            <rect
              x={at - width / 2}
              y={bottom + 3}
              width={width}
              height="5"
              fill={isWanted ? token('green') : token('edge')}
            />
            {isNamed && (
              <text x={at} y={bottom + BANDS_Y} fontWeight={isWanted ? 700 : 600}>
                {name}
              </text>
            )}
          </g>
        ))}
      </g>
      <rect
        x={x((band.lowHertz + band.highHertz) / 2) - bandWidth(band, scale) / 2}
        y={top}
        width={bandWidth(band, scale)}
        height={bottom - top}
        fill={token('green')}
        fillOpacity="0.22"
      />
    </g>
  );
});
