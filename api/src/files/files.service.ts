import { createHash, randomUUID } from 'node:crypto';
import type { StoredFile } from '@second-spanner/shared/contracts/sheets';
import type { Database } from '../platform/database/database.js';
import { notFound } from '../platform/errors/http-problem.js';
import type { SignedIn } from '../platform/signing-in/signed-in.js';
import type { FileStore } from './file-store.js';
import { FilesRepository } from './files.repository.js';
import { makePhoto } from './photo.js';

/** Photos: read, made anew, stored, and given to those who may see them. */
export class FilesService {
  constructor(
    private readonly database: Database,
    private readonly store: FileStore,
    private readonly now: () => Date,
  ) {}

  async add({ shop, person }: SignedIn, upload: Uint8Array): Promise<StoredFile> {
    const { bytes, width, height } = await makePhoto(upload);
    const id = randomUUID();
    await this.store.put(id, bytes);
    const file = {
      ...{ id, mediaType: 'image/jpeg', width, height, bytes: bytes.length },
      sha256: createHash('sha256').update(bytes).digest('hex'),
      ...{ uploadedBy: person.id, uploadedAt: this.now() },
    };
    try {
      await this.database.withShop(shop.id, (scope) => new FilesRepository(scope).insert(file));
    } catch (error) {
      await this.store.remove(id).catch(() => undefined);
      throw error;
    }
    return { id, width, height };
  }

  /** The bytes of a photo and what they are. Another shop's answers as one that is not there. */
  async read({ shop, person }: SignedIn, id: string): Promise<{ mediaType: string; bytes: Uint8Array }> {
    const ownerId = person.role === 'car-owner' ? person.id : null;
    const file = await this.database.readShop(shop.id, (scope) =>
      new FilesRepository(scope).find(id, ownerId),
    );
    const bytes = file && (await this.store.get(file.id));
    if (!bytes) throw notFound('photo');
    return { mediaType: file.mediaType, bytes };
  }
}
