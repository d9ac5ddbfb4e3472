import type { Tool } from '@second-spanner/shared/contracts/registers';
import type { ToolEntity } from './tool.entity.js';

export function toTool(tool: ToolEntity): Tool {
  const { id, code, name, kind, low, high, resolution, calibrationDue } = tool;
  return {
    ...{ id, code, name, kind, low, high, resolution },
    ...(tool.uncertainty && { uncertainty: tool.uncertainty }),
    ...(tool.uncertaintyShare !== null && { uncertaintyShare: tool.uncertaintyShare }),
    ...(tool.length && { length: tool.length }),
    calibrationDue,
  };
}
