/** Whether a process of this machine still runs. */
export const isAlive = (pid: number): boolean => {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    // Somebody else's process may not be signalled, but it is there.
    return error instanceof Error && 'code' in error && error.code === 'EPERM';
  }
};
