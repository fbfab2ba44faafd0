import { Migration001Start } from './001-start';
import { Migration002ShopItems } from './002-shop-items';
import { Migration003People } from './003-people';
import { Migration004Revisions } from './004-revisions';
import { Migration005Orders } from './005-orders';
import { Migration006Walls } from './006-walls';
import { Migration007Changes } from './007-changes';
import { Migration008StateByRevision } from './008-state-by-revision';

/** Every migration, oldest first. */
export const migrationsList = [
  { name: '001-start', class: Migration001Start },
  { name: '002-shop-items', class: Migration002ShopItems },
  { name: '003-people', class: Migration003People },
  { name: '004-revisions', class: Migration004Revisions },
  { name: '005-orders', class: Migration005Orders },
  { name: '006-walls', class: Migration006Walls },
  { name: '007-changes', class: Migration007Changes },
  { name: '008-state-by-revision', class: Migration008StateByRevision },
];
