import type { StepDetail, StepLine } from '@second-spanner/shared/contracts/sheets';
import { slotKeyOf } from '@second-spanner/shared/sheet/slots';
import type { TrayItem } from '../offline/tray-item';

/**
 * Whether a step may be worked although the api has not opened it yet: all it waits for are steps without a second
 * person, whose missing entries lie in the tray, or which are done by now. They go to the api first, as the tray keeps its order.
 */
export function opensByTray(
  step: Pick<StepDetail, 'waitsFor' | 'covered' | 'sheetId'>,
  lines: readonly StepLine[],
  items: readonly TrayItem[],
): boolean {
  if (step.covered || step.waitsFor.length === 0) return false;
  return step.waitsFor.every(({ what, code }) => {
    const line = lines.find((each) => each.code === code);
    // The step's own copy may be older than the sheet's list.
    if (line?.status === 'done') return true;
    if (what !== 'step' || line === undefined || line.critical || line.openSnags > 0) return false;
    const lying = items.filter(
      ({ sheetId, stepCode, refused }) =>
        sheetId === step.sheetId && stepCode === line.code && refused === undefined,
    );
    return line.done + new Set(lying.map(({ request }) => slotKeyOf(request.content))).size >= line.of;
  });
}
