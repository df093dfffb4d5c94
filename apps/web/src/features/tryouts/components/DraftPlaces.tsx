import { Box, chakra } from '@chakra-ui/react';
import type { TakeResponse, TrackRole } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { TextButton } from '../../../components/Button';
import { FieldError } from '../../../components/FieldError';
import { InlineSelect } from '../../../components/InlineSelect';
import { takeName } from '../../takes/rowWords';
import { isReady } from '../../upload/pickedFile';
import type { LengthUnit } from '../positionWords';
import type { Pair } from '../upload/pairs';
import { fileOf, positionText, type DraftAction, type TryOutDraft } from '../upload/tryOutDraft';
import { pairProblem } from '../upload/tryOutRequest';
import { PositionCells } from './PositionCells';

interface DraftPlacesProps {
  draft: TryOutDraft;
  dispatch: (action: DraftAction) => void;
  takes: readonly TakeResponse[];
  lengthUnit: LengthUnit;
}

/** Every place of the draft in its row: which take or files, where it stood, and whether that is how things stand now. */
export function DraftPlaces({ draft, dispatch, takes, lengthUnit }: DraftPlacesProps) {
  const shown = takes.filter(({ id }) => draft.takeIds.includes(id));
  if (shown.length + draft.pairs.length === 0) return null;
  const shared = { draft, dispatch, lengthUnit };
  return (
    <chakra.ol
      aria-label="Takes of the try-out"
      listStyleType="none"
      marginTop="18px"
      borderTop="1px solid"
      borderColor="rule"
    >
      {shown.map((take, index) => (
        <PlaceRow
          key={take.id}
          {...shared}
          placeKey={take.id}
          number={index + 1}
          text={draft.positions[take.id] ?? ''}
          clearLabel={`Leave out ${takeName(take)}`}
          onClear={() => dispatch({ type: 'takeRemoved', takeId: take.id })}
        >
          <b style={{ fontWeight: 600 }}>take {take.number}</b> {take.title}
        </PlaceRow>
      ))}
      {draft.pairs.map((pair, index) => (
        <PlaceRow
          key={pair.key}
          {...shared}
          placeKey={pair.key}
          number={shown.length + index + 1}
          text={positionText(draft, pair, lengthUnit)}
          clearLabel={`Clear pair ${index + 1}`}
          onClear={() => dispatch({ type: 'pairRemoved', key: pair.key })}
        >
          <PairFiles {...{ draft, dispatch, pair }} number={index + 1} />
        </PlaceRow>
      ))}
    </chakra.ol>
  );
}

function PlaceRow({
  draft,
  dispatch,
  lengthUnit,
  placeKey,
  number,
  text,
  clearLabel,
  onClear,
  children,
}: Omit<DraftPlacesProps, 'takes'> & {
  placeKey: string;
  number: number;
  text: string;
  clearLabel: string;
  onClear: () => void;
  children: ReactNode;
}) {
  return (
    <chakra.li
      display="grid"
      gridTemplateColumns={{ base: '24px minmax(0, 1fr) auto', lg: '30px minmax(0, 1fr) 190px 150px 60px' }}
      columnGap="14px"
      alignItems="center"
      paddingY="10px"
      borderBottom="1px solid"
      borderColor="rule"
    >
      <chakra.b fontWeight={600}>{number}</chakra.b>
      <Box minWidth={0} gridColumn={{ base: '2 / -1', lg: 'auto' }}>
        {children}
      </Box>
      <PositionCells {...{ draft, dispatch, lengthUnit, placeKey, number, text }} />
      <Box gridColumn={{ base: '2 / -1', lg: 'auto' }} textAlign={{ lg: 'right' }}>
        <TextButton type="button" aria-label={clearLabel} minHeight="32px" onClick={onClear}>
          Clear
        </TextButton>
      </Box>
    </chakra.li>
  );
}

function PairFiles({
  draft,
  dispatch,
  pair,
  number,
}: {
  draft: TryOutDraft;
  dispatch: (action: DraftAction) => void;
  pair: Pair;
  number: number;
}) {
  const problem = pairProblem(draft, pair);
  const isStereo = pair.kick?.fileId !== undefined && pair.kick.fileId === pair.overhead?.fileId;
  const swap = (
    <TextButton
      type="button"
      fontSize="caption"
      color="ink.muted"
      minHeight="32px"
      aria-label={`Swap kick and overhead of pair ${number}`}
      onClick={() => dispatch({ type: 'swapped', key: pair.key })}
    >
      swap them
    </TextButton>
  );
  if (isStereo)
    return (
      <Box lineHeight="26px">
        {fileOf(draft, pair.kick?.fileId)?.file.name}: kick on the {side(pair.kick?.channel)}, overhead on the{' '}
        {side(pair.overhead?.channel)} {swap}
      </Box>
    );
  return (
    <>
      <Box
        display="grid"
        gridTemplateColumns={{ base: '68px minmax(0, 1fr)', md: '68px minmax(0, 1fr) 82px minmax(0, 1fr)' }}
        alignItems="baseline"
        columnGap="8px"
        rowGap="8px"
      >
        {(['kick', 'overhead'] as const).map((role) => (
          <FileChoice key={role} {...{ draft, dispatch, pair, role, number }} />
        ))}
      </Box>
      {problem ? <FieldError>{problem}</FieldError> : swap}
    </>
  );
}

const side = (channel: number | undefined) => (channel === 0 ? 'left' : 'right');

function FileChoice({
  draft,
  dispatch,
  pair,
  role,
  number,
}: {
  draft: TryOutDraft;
  dispatch: (action: DraftAction) => void;
  pair: Pair;
  role: TrackRole;
  number: number;
}) {
  const mono = draft.files.filter(isReady).filter(({ reading }) => reading.facts.channels === 1);
  const here = pair[role]?.fileId ?? '';
  const options = [...(here ? [] : ['']), ...mono.map(({ id }) => id)];
  return (
    <>
      <Box color="ink.muted" fontSize="small">
        {role}
      </Box>
      <Box minWidth={0}>
        <InlineSelect
          label={`${role === 'kick' ? 'Kick' : 'Overhead'} file of pair ${number}`}
          value={here}
          options={options}
          words={(id) => fileOf(draft, id)?.file.name ?? 'none yet'}
          onChange={(fileId) => fileId && dispatch({ type: 'placed', key: pair.key, role, fileId })}
        />
      </Box>
    </>
  );
}
