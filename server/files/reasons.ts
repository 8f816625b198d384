/** Why the system refused, in words; its own words where it is none of the usual reasons. */

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file or folder',
  EISDIR: 'it is a folder',
  ENOTDIR: 'part of its path is no folder',
  EACCES: 'permission is refused',
  EPERM: 'permission is refused',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  EADDRINUSE: 'another program uses it',
};

export function systemReason(thrown: unknown): string {
  const { code, message } = thrown as NodeJS.ErrnoException;
  return REASONS[code ?? ''] ?? message;
}
