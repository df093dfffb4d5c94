import type { CreateRoomChangeRequest } from '@thudline/contracts';

const mostLetters = 120;

/** A plan as an entry of the room log: dated today, with no take after it until it is built. */
export function plannedChange(
  { what, told, isSoft }: { what: string; told: string; isSoft: boolean },
  today: Date,
): CreateRoomChangeRequest {
  return {
    what: `Planned: ${what}`.slice(0, mostLetters),
    happenedOn: today.toISOString().slice(0, 10),
    category: isSoft ? 'soft-material' : 'floor',
    note: `Not built yet. The estimate, before anything was bought: ${told}`,
    afterTakeIds: [],
  };
}
