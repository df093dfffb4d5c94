import { Box, Flex } from '@chakra-ui/react';
import type { ChangeFigure } from '@thudline/contracts';
import { useWidth } from '../../../lib/useWidth';
import { ink } from '../../sheet/pictures/ink';
import { changeInWords, changeWords, figureName } from '../roomWords';
import { rowLayout } from './rowLayout';

const rowPx = 24;

/** One figure: ring before, disc after, an arrow where it surely changed; the bar is where the change lies with 95 %. */
export function ChangeRow({ figure }: { figure: ChangeFigure }) {
  const { ref, widthPx } = useWidth<HTMLDivElement>(270);
  const { beforeX, afterX, barFromX, barToX } = rowLayout(figure, widthPx);
  const y = rowPx / 2;
  const way = afterX >= beforeX ? 1 : -1;
  const tip = afterX - 8 * way;
  return (
    <Flex
      role="listitem"
      alignItems="center"
      gap="20px"
      wrap={{ base: 'wrap', md: 'nowrap' }}
      columnGap="20px"
      rowGap="0"
      fontSize="small"
      lineHeight="30px"
    >
      <Box width={{ base: '100%', md: '150px' }} flexShrink={0} color="ink.muted">
        {figureName(figure)}
      </Box>
      <Box ref={ref} flex="1 1 120px" minWidth="100px">
        <svg
          width={widthPx}
          height={rowPx}
          role="img"
          aria-label={changeInWords(figure)}
          style={{ display: 'block' }}
        >
          <path d={`M0 ${y}H${widthPx}`} stroke={ink.rule} />
          {barFromX !== null && (
            <path d={`M${barFromX} ${y}H${barToX}`} stroke={ink.together} strokeWidth="5" />
          )}
          {figure.clear && Math.abs(afterX - beforeX) > 18 && (
            <path
              d={`M${beforeX + 8 * way} ${y}H${tip}M${tip - 5 * way} ${y - 5}L${tip} ${y}L${tip - 5 * way} ${y + 5}`}
              fill="none"
              stroke={ink.ink}
              strokeWidth="2"
            />
          )}
          <circle cx={beforeX} cy={y} r={5.4} fill={ink.sheet} stroke={ink.ink} strokeWidth="2" />
          <circle cx={afterX} cy={y} r={5.8} fill={ink.ink} />
        </svg>
      </Box>
      <Box width={{ base: 'auto', md: '180px' }} flexShrink={0} fontWeight={600}>
        {changeWords(figure)}
      </Box>
    </Flex>
  );
}
