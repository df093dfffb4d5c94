import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { KnownRoom } from '../knownRoom';
import { roomResonances } from '../roomResonances';
import { tailEstimate } from '../tailEstimate';
import { fitting, planFrom, planParams, type TreatmentPlan } from '../treatmentPlan';

/** A plan, kept in the address, and what it would do to a room. Everything is computed here, at once. */
export function useCalculator(room: KnownRoom) {
  const [params, setParams] = useSearchParams();
  const plan = planFrom(params, room);
  const key = planParams(plan).toString();
  const estimate = useMemo(() => tailEstimate(room, planFrom(new URLSearchParams(key), room)), [room, key]);
  const resonances = useMemo(() => roomResonances(room, estimate.schroederHz), [room, estimate.schroederHz]);
  const setPlan = (next: TreatmentPlan) =>
    setParams(planParams(fitting(next, room)), { replace: true, preventScrollReset: true });
  return { plan, planKey: key, setPlan, estimate, resonances };
}
