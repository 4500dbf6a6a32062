/** Writes the whole database into one file, which appears only when it is complete. */
export function backupDatabase(options: { url: string; file: string }): Promise<{ file: string; bytes: number }>;

/**
 * Puts a backup in the place of the database; a failed restore leaves the old data as they were.
 * Throws when somebody is connected and it is not forced, or the file is no backup.
 */
export function restoreDatabase(options: {
  url: string;
  file: string;
  isForced?: boolean;
}): Promise<{ replaced: string | undefined }>;
