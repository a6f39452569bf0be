/** Whether the database itself failed, locked or full say: that tells nothing about what was being stored. */
export function isStorageFault(error: unknown): boolean {
  return error instanceof Error && 'code' in error && /^SQLITE_(?!CONSTRAINT)/.test(String(error.code));
}
