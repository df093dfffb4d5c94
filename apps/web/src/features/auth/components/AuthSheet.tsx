import { Box, chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';

export interface MarginText {
  title: string;
  text: ReactNode;
}

/** The sheet for joining and signing in: a line, a short form, a word in the margin. */
export function AuthSheet({
  strong,
  rest,
  margin,
  children,
}: {
  strong: string;
  rest: string;
  margin: MarginText[];
  children: ReactNode;
}) {
  return (
    <SheetPaper margin={<AuthMargin texts={margin} />}>
      <Headline marginTop={{ base: '8px', lg: '19px' }} marginBottom="23px">
        <b>{strong}</b> {rest}
      </Headline>
      <Box maxWidth="400px">{children}</Box>
    </SheetPaper>
  );
}

function AuthMargin({ texts }: { texts: MarginText[] }) {
  return (
    <Box paddingTop={{ base: '22px', lg: '26px' }} lineHeight="22px">
      {texts.map(({ title, text }) => (
        <chakra.p key={title} marginBottom="18px">
          <b>{title}</b>
          <br />
          {text}
        </chakra.p>
      ))}
    </Box>
  );
}
