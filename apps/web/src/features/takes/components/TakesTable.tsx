import { Box } from '@chakra-ui/react';
import type { TakeListItem, Target } from '@thudline/contracts';
import { useEffect, useRef, useState, type ReactNode } from 'react';
import { useNow } from '../hooks/useNow';
import { isMeasuring, takeName } from '../rowWords';
import { ChooseCell } from './ChooseCell';
import { DeletedRow } from './DeletedRow';
import { MeasuringRow } from './MeasuringRow';
import { TagsRow } from './TagsRow';
import { RowAction, TakeRow } from './TakeRow';
import { TakesHead } from './TakesHead';
import { UnmeasuredRow } from './UnmeasuredRow';

export interface RowActions {
  isChosen: (take: TakeListItem) => boolean;
  choose: (take: TakeListItem, chosen: boolean) => void;
  setTags: (takeId: string, tags: string[]) => Promise<void>;
  restore: (take: TakeListItem) => Promise<void>;
  measureAgain: (takeId: string) => Promise<void>;
}

/** The ruled table: one row a take, its pictures under one axis. Without `actions` it can only be read. */
export function TakesTable({
  takes,
  target,
  knownTags,
  actions,
  stale = false,
}: {
  takes: TakeListItem[];
  target: Target;
  knownTags: readonly string[];
  actions?: RowActions;
  /** These rows belong to the sentence before; the new ones are on their way. */
  stale?: boolean;
}) {
  const now = useNow();
  const tagging = useTagging();
  return (
    <TableFrame target={target} stale={stale}>
      {takes.map((take) => {
        const shared = { take, target, now };
        if (take.deletedAt)
          return (
            <DeletedRow
              key={take.id}
              {...shared}
              {...choice(take, actions)}
              onRestore={actions && (() => actions.restore(take))}
            />
          );
        if (isMeasuring(take.measurement))
          return <MeasuringRow key={take.id} {...{ take, now }} canStop={!!actions} />;
        if (actions && take.id === tagging.takeId)
          return (
            <TagsRow
              key={take.id}
              {...{ take, knownTags }}
              onSave={(tags) => actions.setTags(take.id, tags).then(tagging.leave)}
              onLeave={tagging.leave}
            />
          );
        return <ReadyRow key={take.id} {...shared} actions={actions} tagging={tagging} />;
      })}
    </TableFrame>
  );
}

function choice(take: TakeListItem, actions: RowActions | undefined) {
  const chosen = actions?.isChosen(take) ?? false;
  const box = actions ? (
    <ChooseCell {...{ take, chosen }} onChoose={(next) => actions.choose(take, next)} />
  ) : (
    <Box role="cell" gridArea="box" />
  );
  return { chosen, box };
}

function ReadyRow({
  take,
  target,
  now,
  actions,
  tagging,
}: {
  take: TakeListItem;
  target: Target;
  now: Date;
  actions?: RowActions;
  tagging: ReturnType<typeof useTagging>;
}) {
  const { chosen, box } = choice(take, actions);
  if (!actions) return <TakeRow {...{ take, target, now, box }} />;
  if (take.summary === null)
    return (
      <UnmeasuredRow
        {...{ take, target, now, chosen, box }}
        onMeasure={() => actions.measureAgain(take.id)}
      />
    );
  return (
    <TakeRow
      {...{ take, target, now, chosen, box }}
      action={
        <RowAction
          ref={tagging.button(take.id)}
          aria-label={`tags of ${takeName(take)}`}
          onClick={() => tagging.start(take.id)}
        >
          tags
        </RowAction>
      }
    />
  );
}

export function TableFrame({
  target,
  stale = false,
  children,
}: {
  target: Target;
  stale?: boolean;
  children: ReactNode;
}) {
  return (
    <Box
      role="table"
      aria-label="Takes"
      aria-busy={stale}
      marginTop="10px"
      borderBottom="2px solid"
      borderColor="ink"
      opacity={stale ? 0.6 : 1}
    >
      <TakesHead target={target} />
      <Box role="rowgroup" css={{ '& > :last-child': { borderBottomWidth: 0 } }}>
        {children}
      </Box>
    </Box>
  );
}

/** Which take's tags are being written; after that the focus goes back to where it came from. */
function useTagging() {
  const [takeId, setTakeId] = useState<string | null>(null);
  const leftId = useRef<string | null>(null);
  const leftButton = useRef<HTMLButtonElement | null>(null);
  useEffect(() => {
    if (takeId === null) leftButton.current?.focus();
    leftButton.current = null;
    leftId.current = null;
  }, [takeId]);
  return {
    takeId,
    start: (id: string) => setTakeId(id),
    leave: () => {
      leftId.current = takeId;
      setTakeId(null);
    },
    button: (id: string) => (button: HTMLButtonElement | null) => {
      if (button && id === leftId.current) leftButton.current = button;
    },
  };
}
