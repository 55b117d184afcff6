import { useQuery } from '@tanstack/react-query';
import type { ScopeQuery } from '@/analytics/scope-address';
import { scopedAnswer } from '@/analytics/scoped-answer';
import type { TechnicianPerson } from './contract';

/** One technician against like jobs in the scope. */
export const useTechnicianPerson = (technicianId: string, scope: ScopeQuery) =>
  useQuery(scopedAnswer<TechnicianPerson>(`/api/technicians/${technicianId}`, scope));
