import { Box, Flex, chakra } from '@chakra-ui/react';
import type { Target } from '@thudline/contracts';
import { useLatestTakes } from '../hooks/useLatestTakes';
import { useTargetDraft } from '../hooks/useTargetDraft';
import { CountSentence } from './CountSentence';
import { Kept, NotKept } from './Kept';
import { SectionTitle } from './SettingsSection';
import { TargetSentence } from './TargetSentence';
import { TargetStrip } from './TargetStrip';

/** Where the hardest hit belongs, set on the newest take's own hits. */
export function TargetSection({ saved }: { saved: Target }) {
  const { target, kept, failure, move, settle, settleSoon, set } = useTargetDraft(saved);
  const { page, error, retry, latest, report } = useLatestTakes();
  return (
    <chakra.section
      aria-labelledby="settings-target"
      borderTop="1px solid"
      borderColor="rule"
      marginTop={{ base: '14px', lg: '14px' }}
      paddingTop="11px"
      paddingBottom="14px"
      display={{ base: 'block', lg: 'grid' }}
      gridTemplateColumns="164px minmax(0, 1fr)"
      columnGap="32px"
    >
      <Box>
        <Flex alignItems="baseline" columnGap="12px">
          <SectionTitle id="settings-target">Target and aim</SectionTitle>
          <Kept kept={kept} />
        </Flex>
        <Box
          fontSize="caption"
          lineHeight="19px"
          color="ink.muted"
          marginTop="6px"
          marginBottom={{ base: '14px', lg: 0 }}
        >
          Drag the three grips, or type. The arrow keys move by half a{'\u00a0'}dB.
        </Box>
      </Box>
      <Box minWidth={0} paddingTop={{ lg: '5px' }}>
        <TargetStrip
          {...{ target, saved, report }}
          caption={latest ? `take ${latest.number}` : ''}
          onMove={move}
          onKeyMove={(grip, dbfs) => {
            move(grip, dbfs);
            settleSoon();
          }}
          onLetGo={settle}
        />
        <Box marginTop="6px">
          <TargetSentence target={target} onSet={set} />
        </Box>
        <NotKept failure={failure} />
        <CountSentence {...{ page, error, target }} onRetry={retry} />
      </Box>
    </chakra.section>
  );
}
