import { z } from "zod";
import { writeId } from "@/lib/form/write-id";
import { role } from "@/lib/invitation/schema";

const member = z.uuid({ message: "Name the member." });

export const changeRoleInput = z.object({ project: z.string(), writeId, member, role });
export type ChangeRoleInput = z.output<typeof changeRoleInput>;

export const removeMemberInput = z.object({ project: z.string(), writeId, member });
export type RemoveMemberInput = z.output<typeof removeMemberInput>;

export const leaveProjectInput = z.object({ project: z.string(), writeId });
export type LeaveProjectInput = z.output<typeof leaveProjectInput>;
