import { AppendOnly1764547200007 } from './append-only.js';
import { KeptWorkings1796083200012 } from './kept-workings.js';
import { Loading1764547200011 } from './loading.js';
import { People1764547200001 } from './people.js';
import { Records1764547200005 } from './records.js';
import { Registers1764547200002 } from './registers.js';
import { RowSecurity1764547200009 } from './row-security.js';
import { SheetContent1764547200010 } from './sheet-content.js';
import { Sheets1764547200004 } from './sheets.js';
import { Signing1764547200006 } from './signing.js';
import { SpecBook1764547200003 } from './spec-book.js';
import { TwoPeople1764547200008 } from './two-people.js';

/** All migrations; the number in a name says when it runs. */
export const migrations = [
  People1764547200001,
  Registers1764547200002,
  SpecBook1764547200003,
  Sheets1764547200004,
  Records1764547200005,
  Signing1764547200006,
  AppendOnly1764547200007,
  TwoPeople1764547200008,
  RowSecurity1764547200009,
  SheetContent1764547200010,
  Loading1764547200011,
  KeptWorkings1796083200012,
];
