import { PersonEntity } from '../../people/person.entity.js';
import { SessionEntity } from '../../people/session.entity.js';
import { ShopEntity } from '../../people/shop.entity.js';

/** Every entity, by name: nothing is found by searching folders. */
export const entities = [ShopEntity, PersonEntity, SessionEntity];
