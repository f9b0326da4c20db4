/** Writes to standard output; a reader that has seen enough (`| head`) is no error. */
export function print(text: string): void {
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
  });
  process.stdout.write(text);
}
