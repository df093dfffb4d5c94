import { chakra } from '@chakra-ui/react';
import { useEffect, useEffectEvent, useState } from 'react';

/** So long after the last letter the list is asked. */
const pauseMs = 300;

/** Words to look for; the list follows while they are typed. */
export function FindBox({ find, onFind }: { find: string; onFind: (find: string) => void }) {
  const { text, type, settle } = useTyping(find, onFind);
  return (
    <chakra.form
      role="search"
      width={{ base: '100%', lg: '270px' }}
      onSubmit={(event) => {
        event.preventDefault();
        settle();
      }}
    >
      <chakra.input
        type="search"
        aria-label="Find a title, note or finding"
        placeholder="Find a title, note or finding"
        value={text}
        maxLength={100}
        width="100%"
        minHeight="44px"
        marginTop={{ base: 0, lg: '-13px' }}
        paddingTop={{ base: 0, lg: '12px' }}
        paddingX="3px"
        bg="transparent"
        color="ink"
        fontSize="small"
        borderRadius="0"
        borderBottom="2px solid"
        borderColor="edge"
        _placeholder={{ color: 'ink.muted', opacity: 1 }}
        _focusVisible={{
          outline: 'none',
          borderColor: 'overhead',
          boxShadow: '0 2px 0 var(--chakra-colors-overhead)',
        }}
        onChange={(event) => type(event.target.value)}
      />
    </chakra.form>
  );
}

/** What is typed stands in the box, spaces and all, until the address says something that was not typed here. */
function useTyping(find: string, onFind: (find: string) => void) {
  const [typed, setTyped] = useState<string | null>(null);
  const [waiting, setWaiting] = useState(false);
  const [sent, setSent] = useState(find);
  const [seen, setSeen] = useState(find);
  if (find !== seen) {
    setSeen(find);
    if (find !== sent) {
      setSent(find);
      setTyped(null);
    }
  }
  const settle = () => {
    setWaiting(false);
    const words = (typed ?? find).trim();
    if (words === sent) return;
    setSent(words);
    onFind(words);
  };
  const settleLater = useEffectEvent(settle);
  useEffect(() => {
    if (!waiting) return;
    const timer = setTimeout(() => settleLater(), pauseMs);
    return () => clearTimeout(timer);
  }, [typed, waiting]);
  const type = (text: string) => {
    setTyped(text);
    setWaiting(true);
  };
  return { text: typed ?? find, type, settle };
}
