import type { NewEntryRequest, NewSecondReadingRequest } from '@second-spanner/shared/contracts/sheets';
import type { EntryContent, SecondReadingContent } from '@second-spanner/shared/contracts/steps';
import { badInput, HttpProblem } from '../platform/errors/http-problem.js';
import { parseBody } from '../platform/validation/parse-body.js';
import {
  CheckContentDto,
  MeasurementContentDto,
  PhotoContentDto,
  TighteningContentDto,
  ValveTimingContentDto,
  WiringContentDto,
} from './content.dto.js';
import { InspectedDto, MeasuredAgainDto, SettingSeenDto } from './second-content.dto.js';
import { NewEntryDto, NewSecondReadingDto } from './sheets.dto.js';

type Dto = new () => object;

const entryDtos: Readonly<Record<EntryContent['kind'], Dto>> = {
  check: CheckContentDto,
  measurement: MeasurementContentDto,
  tightening: TighteningContentDto,
  wiring: WiringContentDto,
  'valve-timing': ValveTimingContentDto,
  photo: PhotoContentDto,
};

const secondDtos: Readonly<Record<SecondReadingContent['kind'], Dto | null>> = {
  'measured-again': MeasuredAgainDto,
  'strip-read-again': MeasuredAgainDto,
  'setting-and-pull-witnessed': SettingSeenDto,
  inspected: InspectedDto,
  // Leads or valves: told by the field that is there.
  'read-again': null,
};

/** A body as an entry, its content checked by its kind. Throws a 400 problem. */
export function parseEntry(body: unknown): NewEntryRequest {
  const { content, replaces, reason } = parseBody(NewEntryDto, body);
  checkContent(kindIn(content, entryDtos), content);
  return {
    content: content as EntryContent,
    ...(replaces !== undefined && { replaces: replaces.toLowerCase() }),
    ...(reason !== undefined && { reason }),
  };
}

/** A body as a second reading, its content checked by its kind. Throws a 400 problem. */
export function parseSecondReading(body: unknown): NewSecondReadingRequest {
  const { content } = parseBody(NewSecondReadingDto, body);
  const seen = 'sightings' in content ? ValveTimingContentDto : WiringContentDto;
  checkContent(kindIn(content, secondDtos) ?? seen, content);
  return { content: content as SecondReadingContent };
}

function kindIn<T>(content: object, dtos: Readonly<Record<string, T>>): T {
  const kind = 'kind' in content ? content.kind : undefined;
  const dto = typeof kind === 'string' && Object.hasOwn(dtos, kind) ? dtos[kind] : undefined;
  if (dto !== undefined) return dto;
  throw badInput({ field: 'content.kind', message: `This must be one of ${Object.keys(dtos).join(', ')}.` });
}

function checkContent(dto: Dto, content: object): void {
  try {
    parseBody(dto, content);
  } catch (error) {
    throw error instanceof HttpProblem && error.errors ? inContent(error) : error;
  }
  if ('sightings' in content) checkSightings(content.sightings as unknown[]);
}

const inContent = ({ errors = [] }: HttpProblem): HttpProblem =>
  badInput(...errors.map(({ field, message }) => ({ field: `content.${field}`, message })));

const sightingFields = ['cylinder', 'inlet', 'exhaust', 'piston', 'rocking', 'pressure'];

/** What a sighting says is checked against the engine; here, that it says nothing else. */
function checkSightings(positions: readonly unknown[]): void {
  for (const [at, position] of positions.entries()) {
    if (!Array.isArray(position)) continue;
    for (const [index, sighting] of (position as unknown[]).entries()) {
      const keys = typeof sighting === 'object' && sighting !== null ? Object.keys(sighting) : [];
      const unknown = keys.find((key) => !sightingFields.includes(key));
      if (unknown === undefined) continue;
      const field = `content.sightings[${at}][${index}]`;
      throw badInput({ field, message: `A sighting has only ${sightingFields.join(', ')}.` });
    }
  }
}
