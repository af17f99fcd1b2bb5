import { CommanderError } from 'commander';
import { OutputError } from '../plan/files/index.js';
import { UsageError } from './usage-error.js';

export interface Failure {
  readonly exitCode: 0 | 1 | 2;
  readonly lines: readonly string[];
}

/** Refusals of the system that say something of a path which the user named. */
const pathRefusals: Readonly<Partial<Record<string, string>>> = {
  ENOENT: 'there is no such folder: make it, or name another',
  ENOTDIR: 'a part of the path is a file, not a folder: name another',
  EEXIST: 'a file stands where a folder should be: name another',
  EISDIR: 'is a folder: name a file in it',
  EACCES: 'access is denied: name a place that you may read and write',
  EPERM: 'access is denied: name a place that you may read and write',
  EROFS: 'that disk can only be read: name another place',
  ENAMETOOLONG: 'the name is too long: name a shorter one',
  ELOOP: 'the links lead in a circle: name another place',
};

/** What a fault means for the user: his to mend (2), or the tool's (1). */
export function failureOf(fault: unknown): Failure {
  if (fault instanceof CommanderError) return commanderFailure(fault);
  if (fault instanceof UsageError) return { exitCode: 2, lines: fault.faults };
  if (fault instanceof OutputError) return { exitCode: 2, lines: [`--into: ${fault.message}`] };
  if (isSystemError(fault)) {
    const refusal = pathRefusals[fault.code];
    if (refusal !== undefined) return { exitCode: 2, lines: [`${pathWords(fault.path)}: ${refusal}`] };
  }
  const message = fault instanceof Error ? fault.message : String(fault);
  return {
    exitCode: 1,
    lines: [`synodos failed, through no fault of yours: ${message.replace(/\s+/g, ' ')}`],
  };
}

const pathWords = (path = ''): string => (path === '' ? 'a path without a name' : path);

/** Asking for help is no fault; asking for nothing is. */
function commanderFailure({ code, exitCode, message }: CommanderError): Failure {
  if (exitCode === 0) return { exitCode: 0, lines: [] };
  if (code === 'commander.help') return { exitCode: 2, lines: [] };
  return { exitCode: 2, lines: [message.replace(/^error: /, '').replace(/\s+/g, ' ')] };
}

const isSystemError = (fault: unknown): fault is Error & { code: string; path?: string } =>
  fault instanceof Error && 'code' in fault && typeof fault.code === 'string';
