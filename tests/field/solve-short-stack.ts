/**
 * Writes short-stack.json, three rotor and four stator plates with open end faces:
 *   npx tsx tests/field/solve-short-stack.ts [case …]
 * On grids cut 1, 2 and 3 times; REFINEMENTS=2,3,4 before the command asks for finer ones.
 */
import { makeReference } from './reference-file';
import { shortStackCases } from './short-stack-cases';
import { solveShortStack } from './solve-case';

makeReference('short-stack.json', shortStackCases, solveShortStack);
