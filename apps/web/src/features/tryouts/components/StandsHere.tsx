import { chakra } from '@chakra-ui/react';

/** Whether a position is how things stand now. */
export function StandsHere({
  number,
  checked,
  onChoose,
}: {
  number: number;
  checked: boolean;
  onChoose: () => void;
}) {
  return (
    <chakra.label display="inline-flex" alignItems="center" gap="8px" minHeight="44px" cursor="pointer">
      <chakra.input
        type="radio"
        name="stands-now"
        aria-label={`Take ${number} is how things stand now`}
        checked={checked}
        onChange={onChoose}
        width="18px"
        height="18px"
        accentColor="var(--chakra-colors-ink)"
      />
      <chakra.span fontSize="small" color="ink.muted">
        stands here now
      </chakra.span>
    </chakra.label>
  );
}
