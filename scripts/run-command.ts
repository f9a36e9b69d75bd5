import { Stopper } from './stopper';

const readExitCode = (error: unknown) =>
  error instanceof Error && 'exitCode' in error && typeof error.exitCode === 'number' ? error.exitCode : 1;

const describe = (error: unknown) => (error instanceof Error ? error.message : String(error));

/**
 * Runs one of the project's commands: whatever it began is ended when it fails or is told to stop; a
 * failure is printed as a sentence (with its stack when LOG_LEVEL is debug) and becomes the exit code.
 * `exitCodeWhenTold` is the one after Ctrl-C: 0 for a service, which is meant to be ended that way.
 */
export async function runCommand(
  command: (stopper: Stopper) => Promise<void>,
  exitCodeWhenTold: number,
): Promise<void> {
  const stopper = new Stopper((line) => console.error(line), exitCodeWhenTold);
  try {
    await command(stopper);
  } catch (error) {
    if (stopper.wasTold) process.exitCode = exitCodeWhenTold;
    else {
      console.error(describe(error));
      if (process.env['LOG_LEVEL'] === 'debug') console.error(error);
      process.exitCode = readExitCode(error);
    }
    await stopper.stop();
    process.exit();
  }
}
