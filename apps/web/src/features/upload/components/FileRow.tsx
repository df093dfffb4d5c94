import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { TextButton } from '../../../components/Button';

/** One picked file: name and facts, then what there is to say of it, then what can be done. */
export function FileRow({
  name,
  facts,
  action,
  areas = { base: '"name action" "role role" "sent sent"', lg: '"name role sent action"' },
  children,
}: {
  name: string;
  facts: string;
  action: { word: string; label: string; onAct: () => void } | null;
  areas?: { base: string; lg: string };
  children: ReactNode;
}) {
  return (
    <Box
      as="li"
      display="grid"
      gridTemplateColumns={{
        base: 'minmax(0, 1fr) auto',
        lg: 'minmax(0, 242px) minmax(180px, 198px) minmax(0, 1fr) 94px',
      }}
      gridTemplateAreas={areas}
      alignItems="center"
      rowGap="14px"
      minHeight={{ base: 'auto', lg: areas.lg.includes('sent') ? '95px' : '78px' }}
      paddingY={{ base: '16px', lg: '11px' }}
      borderBottom="1px solid"
      borderColor="rule"
    >
      <Box gridArea="name" minWidth={0} paddingRight="18px" marginTop={{ lg: '-5px' }}>
        <Box fontWeight={600} lineHeight="24px" overflowWrap="anywhere" lineClamp={2} title={name}>
          {name}
        </Box>
        <Box fontSize="caption" lineHeight="20px" marginTop="4px" color="ink.muted">
          {facts}
        </Box>
      </Box>
      {children}
      <Box
        gridArea="action"
        justifySelf="end"
        alignSelf={{ base: 'start', lg: 'center' }}
        marginTop={{ lg: '-3px' }}
      >
        {action && (
          <TextButton
            type="button"
            fontSize="small"
            aria-label={action.label}
            position="relative"
            _after={{ content: '""', position: 'absolute', inset: '-11px -8px' }}
            onClick={action.onAct}
          >
            {action.word}
          </TextButton>
        )}
      </Box>
    </Box>
  );
}

/** For rows that carry a sentence instead of a role and a swell. */
export const sentenceAreas = { base: '"name action" "says says"', lg: '"name says says action"' };

export const Sentence = chakra('div', {
  base: { gridArea: 'says', minWidth: 0, paddingRight: { lg: '24px' }, '& [role=alert]': { gap: '16px' } },
});
