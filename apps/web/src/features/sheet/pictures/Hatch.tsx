/** The pattern for "working against you"; used as `fill={`url(#${id})`}`. */
export function Hatch({ id, color, gapPx = 6 }: { id: string; color: string; gapPx?: number }) {
  return (
    <pattern id={id} width={gapPx} height={gapPx} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <line x1={gapPx / 2} x2={gapPx / 2} y1="0" y2={gapPx} stroke={color} strokeWidth="1.2" />
    </pattern>
  );
}
