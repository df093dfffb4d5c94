import { Box, Flex, chakra } from '@chakra-ui/react';
import { paths, type ExportResponse, type MyExportResponse } from '@thudline/contracts';
import { Button, TextButton } from '../../../components/Button';
import { DownloadLink } from '../../../components/DownloadLink';
import { FieldError } from '../../../components/FieldError';
import { ProgressSwell } from '../../../components/ProgressSwell';
import { bytes } from '../../../lib/format';
import { holdsWords, madeWords, progressWords } from '../exportWords';
import { useMyExport } from '../hooks/useMyExport';

/** Everything in one archive: asked for here, made by the server, there for a week. */
export function ExportSection() {
  const { mine, beingMade, error, retry, refusal, ask } = useMyExport();
  const latest = mine?.export;
  return (
    <chakra.section aria-label="Export" borderTop="1px solid" borderColor="rule" paddingTop="16px">
      <Flex gap="14px" alignItems="center" minHeight="48px" wrap={{ base: 'wrap', sm: 'nowrap' }}>
        <Button
          look="outline"
          flexShrink={0}
          aria-disabled={beingMade}
          opacity={beingMade ? 0.6 : 1}
          onClick={() => !beingMade && void ask()}
        >
          Export everything
        </Button>
        <Box fontSize="small" lineHeight="20px" color="ink.muted" minWidth={0} flex="1">
          {mine && !beingMade && holdsWords(mine.holds)}
          {latest && beingMade && <BeingMade latest={latest} />}
        </Box>
      </Flex>
      {mine && <Outcome mine={mine} />}
      {(error || refusal) && (
        <FieldError>
          {refusal || error?.message} {error && <TextButton onClick={retry}>Try again</TextButton>}
        </FieldError>
      )}
    </chakra.section>
  );
}

function BeingMade({ latest }: { latest: ExportResponse }) {
  const words = progressWords(latest);
  return (
    <Box role="status">
      <ProgressSwell share={latest.progress} label="Your archive" valueText={words} />
      {words} You may leave this page.
    </Box>
  );
}

function Outcome({ mine: { export: latest } }: { mine: MyExportResponse }) {
  if (latest?.state === 'failed') return <FieldError>{latest.reason}</FieldError>;
  if (!latest?.file) return null;
  return (
    <Box role="status" fontSize="16px" lineHeight="24px" marginTop="10px">
      <DownloadLink href={paths.exportFile(latest.id)}>
        <chakra.span fontWeight={600} textDecoration="underline" textUnderlineOffset="3px">
          {latest.file.name}
        </chakra.span>
      </DownloadLink>
      , {bytes(latest.file.bytes)}.{' '}
      <chakra.span color="ink.muted">{madeWords(latest, new Date())}</chakra.span>
    </Box>
  );
}
