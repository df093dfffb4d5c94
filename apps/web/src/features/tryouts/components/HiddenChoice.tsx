import { Box, Flex } from '@chakra-ui/react';
import { Button } from '../../../components/Button';
import type { HeardChoice } from './HearRow';

/** While nobody knows which is which: choosing one shows what it was. */
export function HiddenChoice({
  choices,
  onChoose,
}: {
  choices: readonly HeardChoice[];
  onChoose: (placeId: string) => void;
}) {
  return (
    <Box marginTop="24px" paddingTop="16px" borderTop="1px solid" borderColor="rule">
      <Box>Plot, ranking and positions stay hidden until you choose.</Box>
      <Flex wrap="wrap" gap="10px" marginTop="14px">
        {choices.map(({ placeId, word }) => (
          <Button key={placeId} type="button" look="outline" onClick={() => onChoose(placeId)}>
            {word} is best
          </Button>
        ))}
      </Flex>
    </Box>
  );
}
