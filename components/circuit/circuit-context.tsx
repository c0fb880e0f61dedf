'use client';
import { createContext, useContext } from 'react';

/** What the server knew about the reader and the circuit when it sent the page. */
export interface CircuitPlace {
  readonly circuitId: string;
  readonly bench: { readonly slug: string; readonly name: string };
  /** Null for a guest. */
  readonly person: { readonly id: string; readonly name: string; readonly email: string } | null;
  /** What the reader may do here: hints for the screen, decided anew by every call. */
  readonly may: readonly string[];
}

const CircuitContext = createContext<CircuitPlace | null>(null);
export const CircuitPlaceProvider = CircuitContext.Provider;

export function useCircuitPlace(): CircuitPlace {
  const place = useContext(CircuitContext);
  if (place === null) throw new Error('A circuit page stands outside its layout.');
  return place;
}

/** Whether the reader may, as far as the screen knows. */
export function useMay(): (action: string) => boolean {
  const { may } = useCircuitPlace();
  return (action) => may.includes(action);
}
