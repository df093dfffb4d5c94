import { chakra } from '@chakra-ui/react';
import type { KeyboardEvent, PointerEvent } from 'react';
import { dbfs } from '../../../lib/format';
import { gripStepDb } from '../targetGrips';

const widthPx = 20;
const heightPx = 24;
const bigStepDb = 3;

interface GripHandleProps {
  label: string;
  /** The solid one is the aim. */
  solid?: boolean;
  xPx: number;
  /** Of its middle. */
  yPx: number;
  valueDbfs: number;
  minDbfs: number;
  maxDbfs: number;
  /** The level under a place on the screen. */
  dbfsAt: (clientX: number) => number;
  onMove: (dbfs: number) => void;
  onKeyMove: (dbfs: number) => void;
  onLetGo: () => void;
}

/** Something to take hold of: dragged by pointer, moved by half a decibel with the arrow keys. */
export function GripHandle(grip: GripHandleProps) {
  const { label, solid = false, xPx, yPx, valueDbfs, minDbfs, maxDbfs, onMove, onLetGo } = grip;
  const drag = (event: PointerEvent<HTMLElement>) => {
    if (event.currentTarget.hasPointerCapture(event.pointerId)) onMove(grip.dbfsAt(event.clientX));
  };
  return (
    <chakra.div
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuenow={valueDbfs}
      aria-valuemin={minDbfs}
      aria-valuemax={maxDbfs}
      aria-valuetext={dbfs(valueDbfs)}
      position="absolute"
      left={`${xPx - widthPx / 2}px`}
      top={`${yPx - heightPx / 2}px`}
      width={`${widthPx}px`}
      height={`${heightPx}px`}
      display="flex"
      alignItems="center"
      justifyContent="center"
      gap="4px"
      bg={solid ? 'ink' : 'sheet'}
      color={solid ? 'sheet' : 'ink'}
      border="2px solid"
      borderColor="ink"
      borderRadius="10px"
      cursor="ew-resize"
      touchAction="none"
      css={{ '& > i': { width: '2px', height: '8px', background: 'currentColor' } }}
      // A finger needs more than the pill.
      _after={{ content: '""', position: 'absolute', insetX: '-8px', insetY: '-12px' }}
      onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
      onPointerMove={drag}
      onPointerUp={onLetGo}
      onPointerCancel={onLetGo}
      onBlur={onLetGo}
      onKeyDown={(event) => keyMove(event, grip)}
    >
      <i />
      <i />
    </chakra.div>
  );
}

function keyMove(event: KeyboardEvent, { valueDbfs, minDbfs, maxDbfs, onKeyMove }: GripHandleProps) {
  const to: Record<string, number> = {
    ArrowLeft: valueDbfs - gripStepDb,
    ArrowDown: valueDbfs - gripStepDb,
    ArrowRight: valueDbfs + gripStepDb,
    ArrowUp: valueDbfs + gripStepDb,
    PageDown: valueDbfs - bigStepDb,
    PageUp: valueDbfs + bigStepDb,
    Home: minDbfs,
    End: maxDbfs,
  };
  const dbfsNow = to[event.key];
  if (dbfsNow === undefined) return;
  event.preventDefault();
  onKeyMove(dbfsNow);
}
