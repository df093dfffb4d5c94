import { Box } from '@chakra-ui/react';
import type { SetupFields } from '@thudline/contracts';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { PictureText } from '../../sheet/pictures/PictureText';
import { setupLayout, type SetupLayout } from './setupLayout';
import { KitFromAbove, KitFromSide } from './Kit';
import { MicrophonesFromAbove, MicrophonesFromSide } from './Microphones';
import { PictureLegend } from './PictureLegend';

interface SetupPictureProps {
  fields: Pick<SetupFields, 'kick' | 'overhead'>;
  /** A length as the reader wants it. */
  lengthWords: (lengthCm: number) => string;
  /** The picture in a sentence. */
  description: string;
}

/** The kit from above and from the side, to one scale, with what is known of both microphones. */
export function SetupPicture({ fields, lengthWords, description }: SetupPictureProps) {
  const { ref, widthPx } = useWidth<HTMLDivElement>();
  const layout = setupLayout(fields, widthPx);
  return (
    <Box>
      <PictureLegend />
      <Box ref={ref}>
        <svg
          width={widthPx}
          height={layout.heightPx}
          role="img"
          aria-label={description}
          style={{ display: 'block', fontVariantNumeric: 'tabular-nums' }}
        >
          <ViewNames layout={layout} />
          <KitFromAbove layout={layout} />
          <KitFromSide layout={layout} />
          <Uprights layout={layout} />
          <MicrophonesFromAbove {...{ fields, layout }} />
          <MicrophonesFromSide {...{ fields, layout, lengthWords }} />
        </svg>
      </Box>
    </Box>
  );
}

function ViewNames({ layout: { sideTopY } }: { layout: SetupLayout }) {
  return (
    <>
      <PictureText x={0} y={13} bold fill={ink.ink}>
        from above
      </PictureText>
      <PictureText x={0} y={sideTopY - 8} bold fill={ink.ink}>
        from the side
      </PictureText>
    </>
  );
}

/** The same microphone in both views. */
function Uprights({ layout: { kickMicrophone, overhead } }: { layout: SetupLayout }) {
  return [
    { name: 'kick', color: ink.kick, ...kickMicrophone },
    { name: 'overhead', color: ink.overhead, ...overhead },
  ].map(
    ({ name, color, above, side }) =>
      above &&
      side && (
        <path
          key={name}
          d={`M${above.x} ${above.y}V${side.y}`}
          stroke={color}
          strokeWidth="1.4"
          strokeDasharray="2 4"
        />
      ),
  );
}
