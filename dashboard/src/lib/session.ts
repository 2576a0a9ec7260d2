import { queryOptions } from '@tanstack/react-query';
import { createContext, useContext } from 'react';
import type { Role, Session, User } from '@/types/api';
import { api } from './api-client';
import { isApiError } from './api-error';

async function fetchSession(): Promise<Session | null> {
  try {
    const { data } = await api.GET('/api/v1/session');
    return data ?? null;
  } catch (error) {
    if (isApiError(error) && error.status === 401) return null;
    throw error;
  }
}

/** Who is signed in; `null` for nobody. */
export const sessionOptions = () =>
  queryOptions({ queryKey: ['get', '/api/v1/session'], queryFn: fetchSession, staleTime: 60_000 });

export const SessionContext = createContext<User | null>(null);

/** The signed-in person. Pages behind the shell always have one. */
export function useUser(): User {
  const user = useContext(SessionContext);
  if (!user) throw new Error('useUser is for pages behind the sign-in.');
  return user;
}

export function useHasRole(...roles: Role[]): boolean {
  return roles.includes(useUser().role);
}

export const roleNames: Record<Role, string> = {
  viewer: 'Viewer',
  productionEngineer: 'Production engineer',
  qualityLead: 'Quality lead',
  integrator: 'Integrator',
  administrator: 'Administrator',
};
