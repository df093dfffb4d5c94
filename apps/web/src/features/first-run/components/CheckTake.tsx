import { Box, Flex, chakra } from '@chakra-ui/react';

const parts = [
  { time: '0–3 s', strong: 'Sit still.', rest: ' That measures the noise.' },
  { time: '3–11 s', strong: 'Kick alone', rest: ', eight hits, the last two as hard as you ever play.' },
  { time: '11–27 s', strong: 'Eight hard snare hits', rest: ', two seconds apart. They measure the room.' },
  { time: '27–45 s', strong: 'Your loudest groove', rest: ', crashes and all. Let it ring.' },
];

/** What a first take should hold, so that nothing stays untold. */
export function CheckTake() {
  return (
    <>
      <chakra.ol
        borderTop="1px solid"
        borderColor="rule"
        listStyleType="none"
        // On paper it hangs on the wall by the kit.
        _print={{ fontSize: '16pt' }}
      >
        {parts.map(({ time, strong, rest }) => (
          <Flex
            as="li"
            key={time}
            borderBottom="1px solid"
            borderColor="rule"
            paddingTop="8px"
            paddingBottom="9px"
            lineHeight="26px"
            _print={{ lineHeight: '1.5', paddingY: '10pt' }}
          >
            <Box width={{ base: '84px', _print: '100pt' }} flexShrink={0} color="ink.muted">
              {time}
            </Box>
            <Box>
              <b>{strong}</b>
              {rest}
            </Box>
          </Flex>
        ))}
      </chakra.ol>
      <Box marginTop="10px" fontSize="caption" lineHeight="20px" color="ink.muted">
        Protect your ears while you play, and take breaks. Export WAV, 24-bit if you can, without fades or
        normalising.
      </Box>
    </>
  );
}
