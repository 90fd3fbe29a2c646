import type { PlacedLabel } from './placeLabels';

const INK: Readonly<Record<PlacedLabel['role'], string>> = {
  phase: 'var(--plotPoint)',
  transition: 'var(--warmAccent)',
  beyond: 'var(--plotAxis)',
  probe: 'var(--plotAxis)',
};

/** The names and numbers in the picture. */
export function Labels({ labels }: { readonly labels: readonly PlacedLabel[] }) {
  return (
    <g fontSize={12} stroke="var(--paper)" strokeWidth={4} paintOrder="stroke" strokeLinejoin="round">
      {labels.map(({ text, role, x, y, anchor }) => (
        <text
          key={`${role} ${text} ${x} ${y}`}
          x={x}
          y={y}
          textAnchor={anchor}
          dominantBaseline="central"
          fill={INK[role]}
          fontStyle={role === 'beyond' ? 'italic' : 'normal'}
          fontWeight={role === 'transition' || role === 'probe' ? 600 : 400}
        >
          {text}
        </text>
      ))}
    </g>
  );
}
