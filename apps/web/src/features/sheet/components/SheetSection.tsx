import { Box, chakra } from '@chakra-ui/react';
import type { FindingStatus } from '@thudline/contracts';
import type { ReactNode } from 'react';
import { StatusMark, statusColor } from '../../../components/StatusMark';
import { NotePlace } from '../notePlaces';
import { SheetRow } from './RuledSheet';

/** One section: its pen mark left of the head, the head with its word, then sentences, then pictures. */
export function SheetSection({
  id,
  title,
  word,
  status,
  note,
  children,
}: {
  id: string;
  title: string;
  word?: string;
  status?: FindingStatus;
  note?: ReactNode;
  children: ReactNode;
}) {
  return (
    <chakra.section
      id={id}
      aria-labelledby={`${id}-head`}
      marginTop={{ base: '34px', _print: '18px' }}
      scrollMarginTop="12px"
    >
      <SheetRow
        note={
          <>
            <NotePlace name={`margin:${id}`} />
            {note}
          </>
        }
      >
        <Box position="relative" display="flex" alignItems="center" gap="10px">
          {status && (
            <Box position={{ base: 'static', lg: 'absolute' }} left="-45px" lineHeight={0}>
              <StatusMark status={status} sizePx={26} />
            </Box>
          )}
          <chakra.h2
            id={`${id}-head`}
            fontSize={{ base: '22px', lg: 'section' }}
            fontWeight={900}
            lineHeight="30px"
          >
            {title}
            {word && status && (
              <>
                : <chakra.span color={statusColor(status)}>{word}</chakra.span>
              </>
            )}
          </chakra.h2>
        </Box>
        {children}
      </SheetRow>
    </chakra.section>
  );
}

/** The sentences of a section, at the size of a finding. */
export const SectionText = chakra('p', {
  base: { fontSize: 'finding', lineHeight: '27px', marginTop: '4px', textWrap: 'pretty' },
});

export const PictureTitle = chakra('h3', {
  base: {
    fontSize: 'small',
    fontWeight: 600,
    lineHeight: '20px',
    marginTop: { base: '22px', _print: '14px' },
  },
});
