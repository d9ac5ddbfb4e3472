/** What stands in many examples. */
export const time = '2026-12-01T14:06:00.000Z';
export const carId = '3fbd4e85-a03c-4fbb-9d9f-3c4d5e6f7081';
export const sheetId = '40ce5f96-b14d-4acc-8ea0-4d5e6f708192';
export const specId = '51df60a7-c25e-4bdd-9fb1-5e6f708192a3';
export const editionId = '62e071b8-d36f-4cee-80c2-6f708192a3b4';
export const toolId = '73f182c9-e470-4dff-91d3-708192a3b4c5';
export const hash = '9f86d081884c7d659a2feaa0c55ad015a3bf4f1b2b0b822cd15d6c15b0f00a08';
