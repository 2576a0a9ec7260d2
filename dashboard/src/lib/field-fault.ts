import { isApiError } from './api-error';

/** What the server found wrong with one field of a form, by its JSON Pointer; null when nothing. */
export function fieldFault(error: unknown, pointer: string): string | null {
  if (!isApiError(error)) return null;
  return error.errors.find((fault) => fault.pointer === pointer)?.detail ?? null;
}

/** Whether every fault already stands at one of these fields, so that the form needn't say it again. */
export function isAllAtFields(error: unknown, pointers: readonly string[]): boolean {
  if (!isApiError(error) || error.errors.length === 0) return false;
  return error.errors.every(({ pointer }) => pointers.includes(pointer));
}
