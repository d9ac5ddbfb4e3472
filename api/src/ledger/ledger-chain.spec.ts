import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ledgerTrouble, nextLine, type LedgerLine } from './ledger-chain.js';

const by = { id: '00000000-0000-4000-8000-000000000001', name: 'Tomasz Brandt', role: 'builder' } as const;

/** A ledger of some lines, dated a minute apart. */
function ledgerOf(reasons: readonly string[]): LedgerLine[] {
  const lines: LedgerLine[] = [];
  for (const [index, reason] of reasons.entries()) {
    const at = new Date(Date.UTC(2026, 0, 5, 9, index)).toISOString();
    lines.push(nextLine(lines.at(-1) ?? null, { kind: 'sent-back', reason, by, at }));
  }
  return lines;
}

const ledgers = fc.array(fc.string({ unit: 'grapheme' }), { minLength: 2, maxLength: 12 }).map(ledgerOf);
const anyHash = fc.string({ unit: fc.constantFrom(...'0123456789abcdef'), minLength: 64, maxLength: 64 });

describe('a ledger', () => {
  it('holds together as it was written', () => {
    fc.assert(
      fc.property(ledgers, (lines) => {
        expect(ledgerTrouble(lines, lines.at(-1)?.hash)).toBeNull();
      }),
    );
  });

  // SHA-256 of sixty-four noughts and the body, worked out with sha256sum.
  it('binds its first line to sixty-four noughts', () => {
    const [line] = ledgerOf(['x']);
    expect(line).toMatchObject({ seq: 1, prevHash: '0'.repeat(64) });
    expect(line?.body).toBe(
      '{"at":"2026-01-05T09:00:00.000Z","by":{"id":"00000000-0000-4000-8000-000000000001","name":"Tomasz Brandt","role":"builder"},"kind":"sent-back","reason":"x","seq":1}',
    );
    expect(line?.hash).toBe('07354647d6d6bfe0435d6d9bd93011115357fbca90af53adb16cc6ecead66ef2');
  });

  const changes = fc.oneof(
    fc.record({ what: fc.constant('hash' as const), to: anyHash }),
    fc.record({ what: fc.constant('prevHash' as const), to: anyHash }),
    fc.record({ what: fc.constant('body' as const), to: fc.string() }),
    fc.record({ what: fc.constant('at' as const), to: fc.date({ noInvalidDate: true }).map(String) }),
    fc.record({ what: fc.constant('seq' as const), to: fc.integer() }),
  );

  it('shows any change of any line', () => {
    fc.assert(
      fc.property(ledgers, fc.nat(), changes, (lines, at, { what, to }) => {
        const index = at % lines.length;
        const old = lines[index];
        fc.pre(old !== undefined && old[what] !== to);
        const changed = lines.map((line, i) => (i === index ? { ...line, [what]: to } : line));
        expect(ledgerTrouble(changed)).toMatch(/^Line \d+ of the ledger /);
      }),
    );
  });

  it('shows a line left out, a line put in, and two lines swapped', () => {
    fc.assert(
      fc.property(ledgers, fc.nat(), fc.nat(), (lines, a, b) => {
        const [i, j] = [a % lines.length, b % lines.length];
        const [one, other] = [lines[i]!, lines[j]!];
        const without = lines.filter((line) => line !== one);
        if (i < lines.length - 1) expect(ledgerTrouble(without)).not.toBeNull();
        expect(ledgerTrouble([...lines.slice(0, i), other, ...lines.slice(i)])).not.toBeNull();
        fc.pre(i !== j);
        const swapped = lines.map((line) => (line === one ? other : line === other ? one : line));
        expect(ledgerTrouble(swapped)).not.toBeNull();
      }),
    );
  });

  it('shows a tail that was cut off, against the hash it was closed with', () => {
    fc.assert(
      fc.property(ledgers, fc.nat(), (lines, cut) => {
        const kept = lines.slice(0, cut % lines.length);
        expect(ledgerTrouble(kept, lines.at(-1)?.hash)).not.toBeNull();
      }),
    );
  });
});
