import type { Airfoil } from '@tipward/contract';

const WIDTH = 640;
const MARGIN = 24;
const TICKS = [0, 0.25, 0.5, 0.75, 1];

/** The section at one scale in both directions, nose at the left. */
export function OutlinePlot({ airfoil }: { airfoil: Pick<Airfoil, 'name' | 'outline'> }) {
  const ys = airfoil.outline.map(([, y]) => y);
  const scale = WIDTH - 2 * MARGIN;
  const [top, bottom] = [Math.max(...ys, 0.02), Math.min(...ys, -0.02)];
  const height = (top - bottom) * scale + 2 * MARGIN + 16;
  const px = (x: number) => MARGIN + x * scale;
  const py = (y: number) => MARGIN + (top - y) * scale;
  const path = airfoil.outline.map(
    ([x, y], i) => `${i === 0 ? 'M' : 'L'}${px(x).toFixed(2)} ${py(y).toFixed(2)}`,
  );
  const axis = height - 18;
  return (
    <svg
      viewBox={`0 0 ${String(WIDTH)} ${height.toFixed(0)}`}
      role="img"
      aria-label={`Outline of ${airfoil.name}, ${String(airfoil.outline.length)} points`}
      className="block w-full max-w-3xl"
    >
      <line x1={px(0)} x2={px(1)} y1={py(0)} y2={py(0)} stroke="var(--rule)" strokeDasharray="8 3 2 3" />
      <path
        d={`${path.join('')}Z`}
        fill="var(--panel)"
        stroke="var(--ink)"
        strokeWidth="1.5"
        strokeLinejoin="round"
      />
      {TICKS.map((tick) => (
        <g key={tick}>
          <line x1={px(tick)} x2={px(tick)} y1={axis - 4} y2={axis} stroke="var(--rule-strong)" />
          <text
            x={px(tick)}
            y={axis + 13}
            textAnchor="middle"
            fontSize="11"
            fill="var(--ink-soft)"
            className="figures"
          >
            {tick}
          </text>
        </g>
      ))}
      <text x={px(1) + 8} y={axis + 13} fontSize="11" fill="var(--ink-soft)">
        x/c
      </text>
    </svg>
  );
}
