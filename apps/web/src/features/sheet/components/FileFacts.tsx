import { Box, chakra } from '@chakra-ui/react';
import { paths, type TakeResponse } from '@thudline/contracts';
import { DownloadLink } from '../../../components/DownloadLink';
import { bytes, clock, plural } from '../../../lib/format';
import { broadcastWords } from '../broadcastWords';

/** The files as they came: kept and given back bit for bit. */
export function FileFacts({ take }: { take: TakeResponse }) {
  return (
    <chakra.ul listStyleType="none" fontSize="small" marginTop="4px">
      {take.files.map((file) => {
        const roles = take.tracks.filter((track) => track.fileId === file.id);
        const named = roles.map((track) =>
          file.channels > 1 ? `${track.role} on channel ${track.channel + 1}` : track.role,
        );
        return (
          <chakra.li
            key={file.id}
            borderBottom="1px solid"
            borderColor="rule"
            paddingY={{ base: '7px', _print: '3px' }}
          >
            {take.rights.download ? (
              <DownloadLink href={paths.takeFile(take.id, file.id)}>{file.name}</DownloadLink>
            ) : (
              file.name
            )}
            : {named.join(', ')}. {file.encoding}, {file.sampleRateHz / 1000} kHz,{' '}
            {plural(file.channels, 'channel')}, {clock(file.durationS, true)}, {bytes(file.bytes)}
            {file.broadcast && (
              <Box color="ink.muted" fontSize="caption" overflowWrap="anywhere" _print={{ display: 'none' }}>
                {broadcastWords(file.broadcast)}
              </Box>
            )}
            <Box color="ink.muted" fontSize="caption" overflowWrap="anywhere">
              SHA-256 {file.sha256}
            </Box>
          </chakra.li>
        );
      })}
      <chakra.li color="ink.muted" fontSize="caption" paddingY={{ base: '7px', _print: '3px' }}>
        Kept bit for bit.
      </chakra.li>
    </chakra.ul>
  );
}
