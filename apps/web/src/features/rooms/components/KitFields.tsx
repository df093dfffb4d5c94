import { Box, Flex, Grid } from '@chakra-ui/react';
import { Button, TextButton } from '../../../components/Button';
import { FieldLabel } from '../../../components/TextField';
import { KitPlanField } from '../pictures/KitPlanField';
import { draftKit, draftShape, kitFields, type RoomPartProps } from '../roomDraft';
import { NumberField } from './NumberField';

/** Where the player sits: dragged on the plan, moved with the arrow keys, or typed. */
export function KitFields({ draft, settings, set }: RoomPartProps) {
  const unit = settings.lengthUnit === 'metre' ? 'm' : 'ft';
  const shape = draft.isBox ? draftShape(draft, settings) : null;
  const kit = draftKit(draft, settings);
  const move = (place: { xM: number; yM: number } | null) => set(kitFields(place, settings));
  return (
    <Box as="fieldset" minWidth={0}>
      <FieldLabel as="legend">Where the kit stands</FieldLabel>
      {shape?.kind === 'box' && (
        <>
          <Box marginTop="6px">
            <KitPlanField shape={shape} kit={kit} lengthUnit={settings.lengthUnit} onMove={move} />
          </Box>
          <Flex gap="18px" alignItems="center" marginTop="8px" wrap="wrap">
            {kit ? (
              <TextButton type="button" fontSize="small" paddingY="8px" onClick={() => move(null)}>
                take the kit off the plan
              </TextButton>
            ) : (
              <Button
                type="button"
                look="outline"
                onClick={() => move({ xM: (shape.lengthM ?? 0) / 2, yM: (shape.widthM ?? 0) / 2 })}
              >
                Put the kit on the plan
              </Button>
            )}
          </Flex>
        </>
      )}
      <Box fontSize="small" color="ink.muted" marginTop="6px">
        Where you sit, on the plan: the length runs from left to right. Turned counts from looking to the
        right, to the left.
      </Box>
      <Grid templateColumns="repeat(3, 1fr)" gap="14px" marginTop="8px" alignItems="end">
        <NumberField label={`From the left, ${unit}`} text={draft.kitX} onChange={(kitX) => set({ kitX })} />
        <NumberField label={`From the front, ${unit}`} text={draft.kitY} onChange={(kitY) => set({ kitY })} />
        <NumberField label="Turned, °" text={draft.kitTurned} onChange={(kitTurned) => set({ kitTurned })} />
      </Grid>
    </Box>
  );
}
