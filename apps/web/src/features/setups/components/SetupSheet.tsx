import { Box, Flex, chakra } from '@chakra-ui/react';
import type { SetupFields, SetupResponse, UserSettings } from '@thudline/contracts';
import { pathDifferenceM } from '@thudline/dsp';
import type { ReactNode } from 'react';
import { Headline } from '../../../components/Headline';
import { SheetPaper } from '../../../components/SheetPaper';
import { TextField } from '../../../components/TextField';
import { lengthUnitOf } from '../fieldUnits';
import type { SetupDraft } from '../hooks/useSetupDraft';
import { DistanceLine } from '../pictures/DistanceLine';
import { SetupPicture } from '../pictures/SetupPicture';
import { setupDistances, usualKit } from '../setupGeometry';
import {
  apartWords,
  measuredCm,
  measuredWords,
  missingWords,
  numbersWords,
  pictureWords,
  tapeWords,
} from '../setupWords';
import { KickFields, OverheadFields, SetupPart } from './MicrophoneFields';
import { PreampTable } from './PreampTable';

interface SetupSheetProps {
  draft: SetupDraft;
  settings: UserSettings;
  measured: SetupResponse['measured'];
  caption: ReactNode;
  /** What stands after the name in the headline. */
  says: string;
  /** Below "The rest". */
  photo?: ReactNode;
  buttons: ReactNode;
}

/** One setup: fields on the left, what they mean on the right. */
export function SetupSheet({ draft, settings, measured, caption, says, photo, buttons }: SetupSheetProps) {
  const { fields, write } = draft;
  const length = lengthUnitOf(settings.lengthUnit);
  const name = fields.name.trim();
  return (
    <SheetPaper>
      <Box color="ink.muted" fontSize="small" lineHeight="22px">
        {caption}
      </Box>
      <Headline marginTop="4px" overflowWrap="anywhere">
        <b>{name ? `${name.charAt(0).toUpperCase()}${name.slice(1)}.` : 'A new setup.'}</b> {says}
      </Headline>
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 448fr) minmax(0, 520fr)' }}
        columnGap="56px"
        marginTop="4px"
      >
        <Box>
          <Box marginTop="12px">
            <TextField
              label="Name"
              value={fields.name}
              onChange={(next) => write({ name: next })}
              maxLength={60}
              autoComplete="off"
              placeholder="one overhead, high"
            />
          </Box>
          <KickFields {...{ draft, length }} />
          <OverheadFields {...{ draft, length }} />
          <PreampTable draft={draft} />
          <SetupPart title="The rest">
            <Flex direction="column" gap="9px">
              <TextField
                label="Interface"
                value={fields.interface}
                onChange={(next) => write({ interface: next })}
                maxLength={80}
                autoComplete="off"
              />
              <TextField
                label="What else you want to remember"
                value={fields.rest}
                onChange={(next) => write({ rest: next })}
                maxLength={300}
                autoComplete="off"
              />
            </Flex>
            {photo}
          </SetupPart>
        </Box>
        <Box marginTop={{ base: '32px', lg: '14px' }}>
          <SetupPictures {...{ fields, settings, measured }} />
        </Box>
      </chakra.div>
      {buttons}
    </SheetPaper>
  );
}

function SetupPictures({
  fields,
  settings,
  measured,
}: {
  fields: SetupFields;
  settings: UserSettings;
  measured: SetupResponse['measured'];
}) {
  const { differenceCm } = setupDistances(fields);
  const apart = apartWords(fields, measured, settings);
  const missing = missingWords(fields);
  const spreadMs = (measured?.arrivalIqrMs ?? 0) / 2;
  return (
    <>
      <SetupPicture
        fields={fields}
        lengthWords={(lengthCm) => tapeWords(lengthCm, settings.lengthUnit)}
        description={pictureWords(fields, settings)}
      />
      <DistanceLine
        lengthUnit={settings.lengthUnit}
        numbers={
          differenceCm === null
            ? null
            : { lengthCm: differenceCm, words: numbersWords(differenceCm, settings) }
        }
        measured={
          measured && {
            lengthCm: measuredCm(measured, settings),
            words: measuredWords(measured, settings),
            spreadCm: 100 * pathDifferenceM(spreadMs, settings.temperatureC),
          }
        }
      />
      <Box fontSize="small" color="ink.muted" marginTop="14px" lineHeight="22px">
        {apart && <chakra.p color="ink">{apart}</chakra.p>}
        {missing && <p>{missing}</p>}
        <p>
          Drawn with a kick {tapeWords(usualKit.kickDepthCm, settings.lengthUnit)} deep and a snare{' '}
          {tapeWords(usualKit.snare.upCm, settings.lengthUnit)} high, as a right-handed player sits. Every
          field may stay empty; what is missing isn’t drawn.
        </p>
      </Box>
    </>
  );
}
