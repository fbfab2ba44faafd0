import { Migration001Start } from './001-start';

/** Every migration, oldest first. */
export const migrationsList = [{ name: '001-start', class: Migration001Start }];
