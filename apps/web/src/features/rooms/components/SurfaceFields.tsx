import { Box, Flex, Grid, chakra } from '@chakra-ui/react';
import { absorptionTable } from '@thudline/dsp';
import { TextButton } from '../../../components/Button';
import { SelectField } from '../../../components/SelectField';
import { FieldLabel } from '../../../components/TextField';
import { surfacePlaces, type DraftPatch, type SurfacePlace, type RoomPartProps } from '../roomDraft';
import { surfaceWords } from '../roomWords';
import { NumberField } from './NumberField';

const materialIds = absorptionTable.map(({ id }) => id);
const materialName = (id: string) => absorptionTable.find((each) => each.id === id)?.name ?? 'not said';

/** What each side is made of: all of it, and parts of it that are something else. */
export function SurfaceFields({ draft, settings, set }: RoomPartProps) {
  const unit = settings.lengthUnit === 'metre' ? 'm²' : 'ft²';
  const change = (at: number, part: Partial<DraftPatch>) =>
    set({ patches: draft.patches.map((patch, i) => (i === at ? { ...patch, ...part } : patch)) });
  return (
    <Box as="fieldset" minWidth={0}>
      <FieldLabel as="legend">What its sides are made of</FieldLabel>
      <Box fontSize="small" color="ink.muted" marginBottom="8px">
        The front is the side at the bottom of the plan. Doors, windows, curtains and rugs are parts of a
        side.
      </Box>
      {surfacePlaces.map((place) => (
        <Box key={place} borderTop="1px solid" borderColor="rule" paddingY="8px">
          <SelectField
            label={surfaceWords[place]}
            value={draft.materials[place]}
            options={['', ...materialIds]}
            words={(id) => (id === '' ? 'not said' : materialName(id))}
            onChange={(materialId) => set({ materials: { ...draft.materials, [place]: materialId } })}
          />
          {draft.patches.map(
            (patch, i) =>
              patch.place === place && (
                <PatchRow
                  key={i}
                  patch={patch}
                  unit={unit}
                  onChange={(part) => change(i, part)}
                  onRemove={() => set({ patches: draft.patches.filter((_, at) => at !== i) })}
                />
              ),
          )}
          <AddPart place={place} onAdd={(patch) => set({ patches: [...draft.patches, patch] })} />
        </Box>
      ))}
    </Box>
  );
}

function AddPart({ place, onAdd }: { place: SurfacePlace; onAdd: (patch: DraftPatch) => void }) {
  const isFloor = place === 'floor';
  const materialId = isFloor ? 'carpet-on-felt' : place === 'ceiling' ? 'fibre-50-mm' : 'timber-door';
  return (
    <TextButton
      type="button"
      fontSize="small"
      color="ink.muted"
      paddingY="6px"
      aria-label={`add a part to: ${surfaceWords[place]}`}
      onClick={() => onAdd({ place, materialId, area: '' })}
    >
      a part is something else
    </TextButton>
  );
}

function PatchRow({
  patch,
  unit,
  onChange,
  onRemove,
}: {
  patch: DraftPatch;
  unit: string;
  onChange: (part: Partial<DraftPatch>) => void;
  onRemove: () => void;
}) {
  const name = surfaceWords[patch.place].toLowerCase();
  return (
    <Grid
      templateColumns={{ base: 'minmax(0, 1fr)', md: '96px minmax(0, 1fr)' }}
      columnGap="14px"
      rowGap="6px"
      marginTop="8px"
      paddingLeft="14px"
      borderLeft="2px solid"
      borderColor="rule"
    >
      <NumberField label={`Part, ${unit}`} text={patch.area} onChange={(area) => onChange({ area })} />
      <Flex gap="10px" alignItems="end">
        <chakra.div flex="1" minWidth={0}>
          <SelectField
            label={`of the ${name}, is`}
            value={patch.materialId}
            options={materialIds}
            words={materialName}
            onChange={(materialId) => onChange({ materialId })}
          />
        </chakra.div>
        <TextButton
          type="button"
          fontSize="small"
          paddingY="12px"
          aria-label={`remove this part of the ${name}`}
          onClick={onRemove}
        >
          remove
        </TextButton>
      </Flex>
    </Grid>
  );
}
