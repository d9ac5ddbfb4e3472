import type { NewEntryRequest } from '@second-spanner/shared/contracts/sheets';

/** A picture as it lies on the device: bare bytes, which every browser keeps. */
export interface KeptPhoto {
  readonly bytes: ArrayBuffer;
  readonly type: string;
}

/** An entry made on this device that the api has not taken yet. */
export interface NewTrayItem {
  /** Goes along as the Idempotency-Key, so that the entry is recorded once however often it is sent. */
  readonly key: string;
  readonly personId: string;
  readonly sheetId: string;
  readonly sheetCode: string;
  readonly stepCode: string;
  /** What it says, for the tray's own list: `Nut 6, 55.4 N·m`. */
  readonly words: string;
  readonly request: NewEntryRequest;
  /** A photo that is not stored yet; its entry gets the file's id when it is. */
  readonly photo?: KeptPhoto;
  /** ISO time at which it was kept on the device. */
  readonly keptAt: string;
  /** Why the api would not take it. It then stays until its person puts it right or takes it out. */
  readonly refused?: string;
}

export interface TrayItem extends NewTrayItem {
  /** Its place in the order of keeping. */
  readonly seq: number;
}
