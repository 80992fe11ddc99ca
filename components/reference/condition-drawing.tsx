import type { ConditionStep } from '@/lib/trade/tempers/condition-graph';
import type { Temper } from '@/lib/trade/tempers/temper';

import { conditionTree, type TreeNode } from './condition-tree';
import { operationWords } from './temper-words';
import type { ReachableCondition } from '@/lib/trade/tempers/reachable-conditions';

const WIDTH = 720;
const BOX = { width: 62, height: 28 };
const LINE = 46;
const MOST_ACROSS = 340;

interface ConditionDrawingProps {
  from: Temper;
  reachable: readonly ReachableCondition[];
  /** The way that was asked about is drawn heavier. */
  path: readonly ConditionStep[];
}

/** Where a heat treater can get to from a condition, and by what. A phone has the list beneath instead. */
export function ConditionDrawing({ from, reachable, path }: ConditionDrawingProps) {
  const nodes = conditionTree(from, reachable);
  const deepest = Math.max(1, ...nodes.map(({ depth }) => depth));
  const across = Math.min(MOST_ACROSS, (WIDTH - BOX.width - 4) / deepest);
  const height = (Math.max(...nodes.map(({ line }) => line)) + 1) * LINE;
  const onPath = new Set<Temper>([from, ...path.map(({ to }) => to)]);
  const placeOf = ({ depth, line }: TreeNode) => ({ x: 2 + depth * across, y: (line + 0.5) * LINE });
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${height}`}
      role="img"
      aria-label={`Conditions that a heat treater can make of ${from}; the list below says the same`}
      className="h-auto w-full max-w-[720px] max-sm:hidden"
    >
      {nodes.map((node) => {
        const parent = nodes.find(({ condition }) => condition === node.parent);
        return (
          parent && (
            <Way
              key={node.condition}
              from={placeOf(parent)}
              to={placeOf(node)}
              says={node.step ? operationWords(node.step) : ''}
              isAsked={path.some((step) => step.to === node.condition)}
            />
          )
        );
      })}
      {nodes.map((node) => (
        <Box
          key={node.condition}
          at={placeOf(node)}
          says={node.condition}
          isAsked={onPath.has(node.condition)}
        />
      ))}
    </svg>
  );
}

interface Place {
  x: number;
  y: number;
}

function Way({ from, to, says, isAsked }: { from: Place; to: Place; says: string; isAsked: boolean }) {
  const [start, end] = [from.x + BOX.width, to.x];
  const bend = start + 14;
  return (
    <>
      <path
        d={`M${start} ${from.y}H${bend}V${to.y}H${end}m-6 -4l6 4l-6 4`}
        fill="none"
        stroke={isAsked ? 'var(--ink)' : 'var(--quiet)'}
        strokeWidth={isAsked ? 2.2 : 1.2}
      />
      <text
        x={bend + 7}
        y={to.y - 6}
        fill={isAsked ? 'var(--ink)' : 'var(--quiet)'}
        className="font-cond text-source"
      >
        {says}
      </text>
    </>
  );
}

function Box({ at, says, isAsked }: { at: Place; says: string; isAsked: boolean }) {
  return (
    <>
      <rect
        x={at.x}
        y={at.y - BOX.height / 2}
        {...BOX}
        fill={isAsked ? 'var(--proved-wash)' : 'var(--paper)'}
        stroke="var(--ink)"
        strokeWidth={isAsked ? 2.2 : 1.2}
      />
      <text
        x={at.x + BOX.width / 2}
        y={at.y + 5}
        textAnchor="middle"
        fill="var(--ink)"
        className="font-cond text-word"
      >
        {says}
      </text>
    </>
  );
}
