import { Flex, chakra } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';
import { Kept } from './Kept';

/** One ruled part of the settings. */
export function SettingsSection({
  title,
  kept = false,
  children,
}: {
  title: string;
  kept?: boolean;
  children: ReactNode;
}) {
  const id = useId();
  return (
    <chakra.section
      aria-labelledby={id}
      borderTop="1px solid"
      borderColor="rule"
      paddingTop="11px"
      paddingBottom="18px"
    >
      <Flex alignItems="baseline" columnGap="12px" marginBottom="6px">
        <SectionTitle id={id}>{title}</SectionTitle>
        <Kept kept={kept} />
      </Flex>
      {children}
    </chakra.section>
  );
}

export const SectionTitle = chakra('h2', {
  base: { fontSize: 'finding', lineHeight: '26px', fontWeight: 600 },
});
