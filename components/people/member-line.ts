import type { RoleName } from "./role-words";

export type MemberLine = {
  userId: string;
  name: string;
  /** Only for who may manage members, and one's own. */
  email: string | null;
  role: RoleName;
  since: Date;
  digest: boolean;
  isSelf: boolean;
  isLast: boolean;
};
