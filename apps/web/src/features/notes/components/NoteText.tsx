import { Box, chakra } from '@chakra-ui/react';
import { Fragment } from 'react';
import { noteBlocks, type Block, type Inline } from '../noteText';

const List = chakra('ul', { base: { paddingLeft: '20px', margin: '2px 0' } });

/** What somebody wrote, as elements: text never becomes markup. */
export function NoteText({ body }: { body: string }) {
  return (
    <Box overflowWrap="anywhere" css={{ '& > * + *': { marginTop: '7px' } }}>
      {noteBlocks(body).map((block, i) => (
        <BlockView key={i} block={block} />
      ))}
    </Box>
  );
}

function BlockView({ block }: { block: Block }) {
  if (block.kind === 'list')
    return (
      <List as={block.ordered ? 'ol' : 'ul'} listStyleType={block.ordered ? 'decimal' : 'disc'}>
        {block.items.map((item, i) => (
          <li key={i}>
            <Inlines inlines={item} />
          </li>
        ))}
      </List>
    );
  return (
    <p>
      {block.lines.map((line, i) => (
        <Fragment key={i}>
          {i > 0 && <br />}
          <Inlines inlines={line} />
        </Fragment>
      ))}
    </p>
  );
}

function Inlines({ inlines }: { inlines: Inline[] }) {
  return inlines.map((inline, i) => <InlineView key={i} inline={inline} />);
}

function InlineView({ inline }: { inline: Inline }) {
  switch (inline.kind) {
    case 'text':
      return inline.text;
    case 'strong':
      return (
        <strong>
          <Inlines inlines={inline.children} />
        </strong>
      );
    case 'emphasis':
      return (
        <em>
          <Inlines inlines={inline.children} />
        </em>
      );
    case 'link':
      return <NoteLink url={inline.url} words={inline.text} />;
  }
}

/** Where words hide an address, the page it leads to is told beside them. */
function NoteLink({ url, words }: { url: string; words: string }) {
  const { host } = new URL(url);
  return (
    <>
      <a href={url} rel="nofollow noopener noreferrer" target="_blank">
        {words}
      </a>
      {!words.includes(host) && <chakra.span color="ink.muted"> ({host})</chakra.span>}
    </>
  );
}
