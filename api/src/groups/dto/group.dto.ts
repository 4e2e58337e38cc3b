import type { BuildGroup } from '../build-group.entity';

export class GroupMemberDto {
  personId: string;
  /** @example Tamsin Ardley */
  name: string;
}

/** Members who build together. */
export class GroupDto {
  id: string;
  name: string;
  /** When and where they usually meet. */
  about: string;
  members: GroupMemberDto[];
  /** Whether you are one of them. */
  mine: boolean;
}

export class GroupPageDto {
  items: GroupDto[];
  total: number;
  page: number;
  perPage: number;
}

export function groupDto(
  { id, name, about }: BuildGroup,
  members: GroupMemberDto[],
  personId: string,
): GroupDto {
  return { id, name, about, members, mine: members.some((member) => member.personId === personId) };
}
