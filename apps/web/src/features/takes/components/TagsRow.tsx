import { Box } from '@chakra-ui/react';
import type { TakeListItem } from '@thudline/contracts';
import { takeName } from '../rowWords';
import { TagForm } from './TagForm';

/** The tags of one take, written in the place of its row. */
export function TagsRow({
  take,
  knownTags,
  onSave,
  onLeave,
}: {
  take: TakeListItem;
  knownTags: readonly string[];
  onSave: (tags: string[]) => Promise<void>;
  onLeave: () => void;
}) {
  return (
    <Box
      role="row"
      borderBottom="1px solid"
      borderColor="rule"
      bg="target"
      boxShadow="inset 4px 0 0 var(--chakra-colors-ink)"
    >
      <Box role="cell">
        <TagForm
          label={`Tags of ${takeName(take)}, with commas between`}
          initial={take.tags}
          knownTags={knownTags}
          saveLabel="Keep them"
          onSave={onSave}
          onLeave={onLeave}
        />
      </Box>
    </Box>
  );
}
