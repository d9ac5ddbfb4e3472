import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { join, resolve } from 'node:path';

/** Where stored files lie. Names are ids of our own making. */
export interface FileStore {
  put(id: string, bytes: Uint8Array): Promise<void>;
  /** Null when there is no such file. */
  get(id: string): Promise<Uint8Array | null>;
  remove(id: string): Promise<void>;
}

/** Files on this machine's disk, in folders by the first two characters of their id. */
export class DiskFileStore implements FileStore {
  private readonly folder: string;

  constructor(folder: string) {
    this.folder = resolve(folder);
  }

  async put(id: string, bytes: Uint8Array): Promise<void> {
    const path = this.pathOf(id);
    await mkdir(join(path, '..'), { recursive: true });
    const half = `${path}.part`;
    const file = await open(half, 'w', 0o600);
    try {
      await file.writeFile(bytes);
      // What is answered as stored must outlive a power cut.
      await file.sync();
    } finally {
      await file.close();
    }
    await rename(half, path);
  }

  async get(id: string): Promise<Uint8Array | null> {
    try {
      return await readFile(this.pathOf(id));
    } catch (error) {
      if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
      throw error;
    }
  }

  async remove(id: string): Promise<void> {
    await rm(this.pathOf(id), { force: true });
  }

  private pathOf(id: string): string {
    return join(this.folder, id.slice(0, 2), `${id}.jpg`);
  }
}
