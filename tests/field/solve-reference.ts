/**
 * Writes reference.json, the endless stack:
 *   npx tsx tests/field/solve-reference.ts [case …]
 * On grids cut 1, 2 and 3 times; REFINEMENTS=2,3,4 before the command asks for finer ones.
 */
import { cases } from './cases';
import { makeReference } from './reference-file';
import { solveCase } from './solve-case';

makeReference('reference.json', cases, solveCase);
