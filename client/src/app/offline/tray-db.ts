import { Injectable } from '@angular/core';
import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { NewTrayItem, TrayItem } from './tray-item';

interface TraySchema extends DBSchema {
  readonly waiting: { readonly key: number; readonly value: TrayItem };
}

const databaseName = 'second-spanner-tray';

/** Where the waiting tray lies on the device: its items in the order in which they were kept. */
@Injectable({ providedIn: 'root' })
export class TrayDb {
  private opened: Promise<IDBPDatabase<TraySchema>> | null = null;

  async all(): Promise<readonly TrayItem[]> {
    return (await this.open()).getAll('waiting');
  }

  async add(item: NewTrayItem): Promise<TrayItem> {
    const database = await this.open();
    // The store itself gives the next number.
    const seq = await database.add('waiting', item as TrayItem);
    return { ...item, seq };
  }

  async put(item: TrayItem): Promise<void> {
    await (await this.open()).put('waiting', item);
  }

  async take(seq: number): Promise<void> {
    await (await this.open()).delete('waiting', seq);
  }

  private open(): Promise<IDBPDatabase<TraySchema>> {
    this.opened ??= openDB<TraySchema>(databaseName, 1, {
      upgrade: (database) => {
        database.createObjectStore('waiting', { keyPath: 'seq', autoIncrement: true });
      },
    });
    // Asks the browser not to throw the tray away when the disk fills up; where it can't be asked, so be it.
    void (navigator.storage as StorageManager | undefined)?.persist();
    return this.opened;
  }
}
