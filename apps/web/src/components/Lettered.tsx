import { chakra } from '@chakra-ui/react';

/** A small ringed letter that joins what is said to its note in the margin. */
export function Lettered({ children }: { children: string }) {
  return (
    <chakra.span
      aria-hidden
      display="inline-grid"
      placeItems="center"
      width="18px"
      height="18px"
      border="1px solid"
      borderColor="ink"
      borderRadius="50%"
      fontSize="caption"
      lineHeight="1"
      color="ink"
      verticalAlign="1px"
    >
      {children}
    </chakra.span>
  );
}
