import { Migration001Start } from './001-start';
import { Migration002ShopItems } from './002-shop-items';

/** Every migration, oldest first. */
export const migrationsList = [
  { name: '001-start', class: Migration001Start },
  { name: '002-shop-items', class: Migration002ShopItems },
];
