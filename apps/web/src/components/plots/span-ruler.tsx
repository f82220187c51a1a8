import { formatQuantity } from '@tipward/design-model';
import { useSpanAxis } from './span-axis-context.ts';

const SHARES = [0.2, 0.4, 0.6, 0.8, 1] as const;

/** The shared axis written out once: metres, with r/R beneath, and the cursor's place. */
export function SpanRuler({ cursorRadiusM }: { cursorRadiusM: number | null }) {
  const axis = useSpanAxis();
  const text = { fontSize: 10.5, className: 'font-mono', textAnchor: 'middle' } as const;
  const share = cursorRadiusM === null ? null : cursorRadiusM / axis.tipRadiusM;
  return (
    <div>
      <svg width={axis.width} height={34} aria-hidden="true" className="block overflow-visible">
        <line x1={axis.left} x2={axis.right} y1={0.5} y2={0.5} stroke="var(--ink-soft)" />
        {axis.scale.ticks(8).map((radiusM) => (
          <g key={radiusM}>
            <line x1={axis.scale(radiusM)} x2={axis.scale(radiusM)} y1={0} y2={4} stroke="var(--ink-soft)" />
            <text {...text} x={axis.scale(radiusM)} y={14} fill="var(--ink)">
              {radiusM}
            </text>
          </g>
        ))}
        {SHARES.filter((value) => value * axis.tipRadiusM >= axis.hubRadiusM).map((value) => (
          <text key={value} {...text} x={axis.scale(value * axis.tipRadiusM)} y={28} fill="var(--ink-soft)">
            {value.toFixed(1)}
          </text>
        ))}
        <text
          x={axis.left - 8}
          y={14}
          textAnchor="end"
          fontSize={10.5}
          className="font-sans"
          fill="var(--ink)"
        >
          r, m
        </text>
        <text
          x={axis.left - 8}
          y={28}
          textAnchor="end"
          fontSize={10.5}
          className="font-sans"
          fill="var(--ink-soft)"
        >
          r/R
        </text>
        {cursorRadiusM !== null && <path d={`M${axis.scale(cursorRadiusM)} 0l4 6h-8z`} fill="var(--ink)" />}
      </svg>
      <p className="m-0 min-h-5 pl-[52px] font-mono text-xs tabular-nums" data-testid="span-readout">
        {share === null
          ? 'Span cursor: point at a plot, or use the arrow keys on one'
          : `r ${formatQuantity('radiusM', cursorRadiusM)} m   r/R ${share.toFixed(3)}`}
      </p>
    </div>
  );
}
