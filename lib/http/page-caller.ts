import { headers } from 'next/headers';
import { notFound, redirect } from 'next/navigation';
import { cache } from 'react';
import { database } from '@/db/client';
import type { Caller, Person } from '@/lib/access/caller';
import { environment } from '@/lib/env/environment';
import { Problem } from '@/lib/errors/problem';
import { callerOf } from './who';

/** Who asks for this page; looked up once for a request. */
export const pageCaller = cache(async (): Promise<Caller> => callerOf(database(), (await headers()).get('cookie'), environment().secure));

/** The person of a page that needs one; anybody else signs in first and comes back to `path`. */
export async function pagePerson(path: string): Promise<Caller & { readonly person: Person }> {
  const caller = await pageCaller();
  if (!caller.person) redirect(`/sign-in?to=${encodeURIComponent(path)}`);
  return { ...caller, person: caller.person };
}

/** Runs a gate for a page: what is not there, or of a bench the caller is not in, is the page 'not found'. */
export async function passOrNotFound<T>(gate: Promise<T>): Promise<T> {
  try {
    return await gate;
  } catch (error) {
    if (error instanceof Problem && error.code === 'not-found') notFound();
    throw error;
  }
}
