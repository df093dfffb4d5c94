import { Box } from '@chakra-ui/react';
import type { MeResponse } from '@thudline/contracts';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { DeletionSection } from './DeletionSection';
import { DevicesSection } from './DevicesSection';
import { ExportSection } from './ExportSection';
import { KeysSection } from './KeysSection';
import { MailSection } from './MailSection';
import { TargetSection } from './TargetSection';
import { UnitsSection } from './UnitsSection';
import { YouSection } from './YouSection';

/** Everything that is the player's own to set; each field is kept at once. */
export function SettingsSheet({ me }: { me: MeResponse }) {
  return (
    <SheetPaper>
      <Headline marginTop={{ base: '4px', lg: '3px' }}>
        <b>Settings.</b> Every sheet follows at once; nothing is measured again.
      </Headline>
      <TargetSection saved={me.settings.target} />
      <Box
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'repeat(2, minmax(0, 1fr))' }}
        columnGap="56px"
        rowGap={{ base: '18px', lg: 0 }}
      >
        <Box>
          <YouSection me={me} />
          <UnitsSection settings={me.settings} />
          <KeysSection singleKeys={me.settings.singleKeys} />
        </Box>
        <Box>
          <MailSection settings={me.settings} />
          <DevicesSection />
        </Box>
        <ExportSection />
        <DeletionSection deleteAfter={me.deleteAfter} />
      </Box>
    </SheetPaper>
  );
}
