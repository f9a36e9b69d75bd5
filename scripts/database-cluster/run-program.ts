import { spawn } from 'node:child_process';
import type { ClusterOwner } from './cluster-owner';

export interface ProgramResult {
  code: number;
  output: string;
}

/**
 * Runs a program as the cluster's owner and returns its exit code and everything it wrote.
 * It works in "/", because the owner may not be able to enter the folder of this process.
 */
export function runProgram(
  program: string,
  parameters: string[],
  owner: ClusterOwner,
  input = '',
): Promise<ProgramResult> {
  return new Promise((resolve, reject) => {
    const child = spawn(program, parameters, {
      cwd: '/',
      ...owner,
      env: { PATH: process.env['PATH'], LC_ALL: 'C.UTF-8', TZ: 'UTC' },
      stdio: ['pipe', 'pipe', 'pipe'],
    });
    let output = '';
    const collect = (chunk: Buffer) => (output += chunk.toString());
    child.stdout.on('data', collect);
    child.stderr.on('data', collect);
    child.stdin.on('error', () => undefined);
    child.stdin.end(input);
    child.once('error', reject);
    child.once('close', (code) => resolve({ code: code ?? 1, output }));
  });
}

/** As runProgram, but a non-zero exit code becomes an error that shows what the program wrote. */
export async function runOrFail(
  program: string,
  parameters: string[],
  owner: ClusterOwner,
  input = '',
): Promise<string> {
  const { code, output } = await runProgram(program, parameters, owner, input);
  if (code !== 0) throw new Error(`${program} ended with ${code}:\n${output.trim()}`);
  return output;
}
