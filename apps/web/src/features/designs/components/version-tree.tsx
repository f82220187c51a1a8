import type { VersionSummary } from '@tipward/contract';
import { useNavigate } from 'react-router-dom';
import { layOutTree } from '../lib/version-tree.ts';
import type { TreeNode } from '../lib/version-tree.ts';

const COLUMN_PX = 76;
const LANE_PX = 44;
const x = (node: TreeNode) => 24 + node.column * COLUMN_PX;
const y = (node: TreeNode) => 18 + node.lane * LANE_PX;

const FILLS: Partial<Record<VersionSummary['state'], string>> = {
  released: 'var(--holds)',
  approved: 'var(--holds-wash)',
  'in-review': 'var(--look-wash)',
  'changes-requested': 'var(--fails-wash)',
};

function Branch({ node }: { node: TreeNode }) {
  if (node.parent === null) return null;
  if (node.parent.lane === node.lane)
    return (
      <line
        x1={x(node.parent)}
        y1={y(node)}
        x2={x(node)}
        y2={y(node)}
        stroke="var(--rule-strong)"
        strokeWidth="1.5"
      />
    );
  const bend = `C${x(node.parent) + 30} ${y(node.parent)} ${x(node) - 46} ${y(node)} ${x(node)} ${y(node)}`;
  return (
    <path
      d={`M${x(node.parent)} ${y(node.parent)}${bend}`}
      fill="none"
      stroke="var(--rule-strong)"
      strokeWidth="1.5"
    />
  );
}

function Knot({ node }: { node: TreeNode }) {
  const navigate = useNavigate();
  const { version } = node;
  const letter = version.release === null ? '' : `, release ${version.release.letter}`;
  return (
    <a
      href={`/versions/${version.id}`}
      aria-label={`${version.label}, ${version.state.replaceAll('-', ' ')}${letter}`}
      onClick={(event) => {
        if (event.metaKey || event.ctrlKey || event.shiftKey) return;
        event.preventDefault();
        void navigate(`/versions/${version.id}`);
      }}
    >
      <title>{version.note}</title>
      <circle
        cx={x(node)}
        cy={y(node)}
        r={version.release === null ? 6 : 8}
        fill={FILLS[version.state] ?? 'var(--paper)'}
        stroke="var(--ink)"
        strokeWidth="1.5"
      />
      <text x={x(node)} y={y(node) + 22} textAnchor="middle" fontSize="12" fill="var(--ink)">
        {version.label}
        {version.release !== null && ` · ${version.release.letter}`}
      </text>
    </a>
  );
}

/** Which version came from which, in time from left to right. The table beneath says the same in words. */
export function VersionTree({ versions }: { versions: readonly VersionSummary[] }) {
  const nodes = layOutTree(versions);
  const width = 48 + (nodes.length - 1) * COLUMN_PX;
  const height = 48 + Math.max(...nodes.map(({ lane }) => lane)) * LANE_PX;
  return (
    <div role="region" aria-label="Tree of versions" tabIndex={0} className="mb-3 overflow-x-auto">
      <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block">
        {nodes.map((node) => (
          <Branch key={node.version.id} node={node} />
        ))}
        {nodes.map((node) => (
          <Knot key={node.version.id} node={node} />
        ))}
      </svg>
    </div>
  );
}
