import { chakra } from '@chakra-ui/react';
import { Headline } from '../../../components/Headline';
import { LeaveQuestion } from '../../../components/LeaveQuestion';
import { PageLoading } from '../../../components/PageLoading';
import { SheetPaper } from '../../../components/SheetPaper';
import { headline } from '../headline';
import { useNewTake, type NewTake } from '../hooks/useNewTake';
import { usePreviousTake } from '../hooks/usePreviousTake';
import { fileProgress } from '../uploadProgress';
import { AboutTake, NewTakeNote } from './AboutTake';
import { DropAnywhere, type ChooseFiles } from './DropAnywhere';
import { DropBox } from './DropBox';
import { FileRows } from './FileRows';
import { FirstRun } from './FirstRun';
import { SendRow } from './SendRow';
import { WhatChanged } from './WhatChanged';

/** `firstTake` is undefined while it isn't known whether there are takes already. */
export function NewTakeSheet({
  firstTake,
  followsTakeId,
}: {
  firstTake: boolean | undefined;
  followsTakeId: string | null;
}) {
  const newTake = useNewTake(usePreviousTake(followsTakeId));
  const empty = newTake.state.files.length === 0;
  return (
    <DropAnywhere onFiles={newTake.pick}>
      {(choose) => {
        if (empty && firstTake === undefined) return <PageLoading />;
        return (
          <SheetPaper>
            {empty && firstTake ? (
              <FirstRun onChoose={() => choose()} />
            ) : (
              <Upload newTake={newTake} choose={choose} />
            )}
            {newTake.leaving.asking && (
              <LeaveQuestion
                {...newTake.leaving}
                strong="Files are still on their way."
                rest="Leaving stops them."
                leaveWords="Leave and stop them"
              />
            )}
          </SheetPaper>
        );
      }}
    </DropAnywhere>
  );
}

function Upload({ newTake, choose }: { newTake: NewTake; choose: ChooseFiles }) {
  const { strong, rest } = wordsFor(newTake);
  return (
    <>
      <Headline marginTop={{ base: '4px', lg: '5px' }}>
        <b>{strong}</b> {rest}
      </Headline>
      <chakra.span role="status" srOnly>
        {strong}
      </chakra.span>
      {newTake.state.files.length === 0 ? (
        <chakra.div marginTop="20px">
          <DropBox onChoose={() => choose()} minHeight="200px" />
        </chakra.div>
      ) : (
        <FileRows newTake={newTake} choose={choose} />
      )}
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: '1fr', lg: newTake.previous ? '1fr 1fr' : '1fr' }}
        columnGap="56px"
      >
        <WhatChanged newTake={newTake} />
        <AboutTake newTake={newTake} />
      </chakra.div>
      <NewTakeNote newTake={newTake} />
      <SendRow newTake={newTake} />
    </>
  );
}

function wordsFor({ state, arranged }: NewTake) {
  const { sending } = state;
  const sizesBytes = arranged.used.map(({ file }) => file.size);
  const last = sending.phase === 'sending' ? fileProgress(sizesBytes, sending.progress).at(-1) : undefined;
  return headline({
    arranged,
    sending,
    secondsLeft: last?.secondsLeft ?? null,
    pickedCount: state.files.length,
  });
}
