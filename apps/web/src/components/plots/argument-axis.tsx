import type { ScaleLinear } from 'd3-scale';

/** The lower axis of a rotor-level plot: ticks, name with unit, and the operating cursor's value. */
export function ArgumentAxis({
  x,
  top,
  bottom,
  title,
  cursor,
}: {
  x: ScaleLinear<number, number>;
  top: number;
  bottom: number;
  title: string;
  cursor: { x: number; text: string } | null;
}) {
  const [left = 0, right = 0] = x.range();
  return (
    <g>
      {x.ticks(8).map((value) => (
        <g key={value}>
          <line x1={x(value)} x2={x(value)} y1={top} y2={bottom} stroke="var(--rule)" />
          <text
            x={x(value)}
            y={bottom + 13}
            textAnchor="middle"
            fontSize={10.5}
            className="font-mono"
            fill="var(--ink-soft)"
          >
            {value}
          </text>
        </g>
      ))}
      <line x1={left} x2={right} y1={bottom} y2={bottom} stroke="var(--ink-soft)" />
      <text
        x={right}
        y={bottom + 28}
        textAnchor="end"
        fontSize={10.5}
        className="font-sans"
        fill="var(--ink-soft)"
      >
        {title}
      </text>
      {cursor !== null && (
        <text x={left} y={bottom + 28} fontSize={10.5} className="font-mono" fill="var(--ink)">
          {cursor.text}
        </text>
      )}
    </g>
  );
}
