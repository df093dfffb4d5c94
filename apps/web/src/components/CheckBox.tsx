import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Box22 = chakra('input', {
  base: {
    appearance: 'none',
    gridArea: '1 / 1',
    width: '22px',
    height: '22px',
    margin: 0,
    border: '2px solid',
    borderColor: 'edge',
    borderRadius: '3px',
    cursor: 'pointer',
    _checked: { borderColor: 'ink' },
    _disabled: { borderColor: 'rule', cursor: 'not-allowed' },
  },
});

/** A box to tick with a pen. */
export function CheckBox({
  checked,
  onChange,
  disabled,
  label,
  children,
}: {
  checked: boolean;
  onChange: (checked: boolean) => void;
  disabled?: boolean;
  /** Its name where no text stands beside it. */
  label?: string;
  children?: ReactNode;
}) {
  return (
    <chakra.label
      display="inline-flex"
      alignItems="center"
      gap="12px"
      minHeight="26px"
      cursor={disabled ? 'not-allowed' : 'pointer'}
    >
      <chakra.span display="grid" flexShrink={0}>
        <Box22
          type="checkbox"
          checked={checked}
          disabled={disabled}
          aria-label={label}
          onChange={(event) => onChange(event.target.checked)}
        />
        {checked && <PenTick />}
      </chakra.span>
      {children && <span>{children}</span>}
    </chakra.label>
  );
}

function PenTick() {
  return (
    <chakra.svg
      aria-hidden
      gridArea="1 / 1"
      width="22px"
      height="22px"
      viewBox="0 0 22 22"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.1"
      strokeLinecap="round"
      strokeLinejoin="round"
      color="ink"
      pointerEvents="none"
    >
      <path d="M5.2 11.8 8.8 16.4 17 5.8" />
    </chakra.svg>
  );
}
