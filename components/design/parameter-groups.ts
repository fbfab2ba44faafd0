import {
  sectionParameters,
  sharedParameters,
  type Parameter,
  type ParameterGroup,
} from '@/geometry';

export const groupTitles: Record<ParameterGroup, string> = {
  law: 'Tuning law and range',
  turn: 'Turning and rests',
  stack: 'Plates of the section',
  shaft: 'Shaft and clearances',
  posts: 'Stator posts',
  envelope: 'Room allowed',
  sheet: 'Sheet',
  frame: 'Spacers, slots and frame',
};

export interface GroupEntry {
  readonly key: string;
  readonly parameter: Parameter;
}

export interface Group {
  readonly group: ParameterGroup;
  readonly title: string;
  readonly entries: readonly GroupEntry[];
}

/** The table in the order in which it is declared, cut where the group changes. */
function groupsOf(table: Record<string, Parameter>): Group[] {
  const groups: Group[] = [];
  for (const [key, parameter] of Object.entries(table)) {
    const last = groups[groups.length - 1];
    const entry = { key, parameter };
    if (last?.group === parameter.group) {
      groups[groups.length - 1] = { ...last, entries: [...last.entries, entry] };
    } else {
      groups.push({
        group: parameter.group,
        title: groupTitles[parameter.group],
        entries: [entry],
      });
    }
  }
  return groups;
}

/** The choices on which it depends which parameters of a table count. */
function decidingKeys(table: Record<string, Parameter>): string[] {
  return [
    ...new Set(Object.values(table).flatMap(({ appliesTo }) => Object.keys(appliesTo ?? {}))),
  ];
}

export const sectionDeciding = decidingKeys(sectionParameters);
export const sharedDeciding = decidingKeys(sharedParameters);

export const sectionGroups = groupsOf(sectionParameters);
export const sharedGroups = groupsOf(sharedParameters);
