import { chakra } from '@chakra-ui/react';
import { TextField } from '../../../components/TextField';
import type { FieldUnit } from '../fieldUnits';
import { useTypedNumber } from '../hooks/useTypedNumber';

interface MeasureFieldProps {
  label: string;
  value: number | null;
  unit: FieldUnit;
  onChange: (value: number | null) => void;
}

/** A number that may stay empty, with its unit at the end of the line. */
export function MeasureField({ label, value, unit, onChange }: MeasureFieldProps) {
  const { text, isNumber, type, leave } = useTypedNumber(value, unit, onChange);
  return (
    <TextField
      label={label}
      value={text}
      autoComplete="off"
      maxLength={12}
      error={isNumber ? undefined : 'Write a number.'}
      onChange={type}
      onBlur={leave}
      end={<UnitWord>{unit.words}</UnitWord>}
    />
  );
}

/** The same in a cell of a table, which names it. */
export function MeasureCell({ label, value, unit, onChange }: MeasureFieldProps) {
  const { text, isNumber, type, leave } = useTypedNumber(value, unit, onChange);
  return (
    <chakra.span display="flex" alignItems="center" borderBottom="2px solid" borderColor="edge">
      <chakra.input
        aria-label={label}
        aria-invalid={!isNumber || undefined}
        value={text}
        autoComplete="off"
        maxLength={12}
        width="100%"
        minWidth={0}
        minHeight="36px"
        bg="transparent"
        color={isNumber ? 'ink' : 'fix'}
        fontWeight={600}
        borderRadius="0"
        onChange={(event) => type(event.target.value)}
        onBlur={leave}
      />
      <UnitWord>{unit.words}</UnitWord>
    </chakra.span>
  );
}

const UnitWord = ({ children }: { children: string }) => (
  <chakra.span aria-hidden color="ink.muted" paddingRight="3px">
    {children}
  </chakra.span>
);
