/**
 * Runs the start of a process; when that fails, says why in plain words and leaves with exit code 1. A wrong variable or a
 * port in use is for the person who starts it to put right, and a stack trace would hide the line that says so.
 */
export async function orExplain(start: () => Promise<void>): Promise<void> {
  try {
    await start();
  } catch (error) {
    console.error(`Strandline did not start. ${error instanceof Error ? error.message : String(error)}`);
    process.exit(1);
  }
}
