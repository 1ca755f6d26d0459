"use server";

import { defineAction } from "@/lib/actions/define-action";
import { invitePerson } from "@/lib/invitation/invite-person";
import { resendInvitation as resendIt } from "@/lib/invitation/resend-invitation";
import { changeInvitationInput, inviteInput } from "@/lib/invitation/schema";
import { withdrawInvitation as withdrawIt } from "@/lib/invitation/withdraw-invitation";
import { changeRole as changeIt } from "@/lib/member/change-role";
import { leaveProject as leaveIt } from "@/lib/member/leave-project";
import { removeMember as removeIt } from "@/lib/member/remove-member";
import { changeRoleInput, leaveProjectInput, removeMemberInput } from "@/lib/member/schema";

export const invite = defineAction({
  name: "invite-person",
  permission: "member.manage",
  input: inviteInput,
  run: invitePerson,
});

export const resendInvitation = defineAction({
  name: "resend-invitation",
  permission: "member.manage",
  input: changeInvitationInput,
  run: resendIt,
});

export const withdrawInvitation = defineAction({
  name: "withdraw-invitation",
  permission: "member.manage",
  input: changeInvitationInput,
  run: withdrawIt,
});

export const changeRole = defineAction({
  name: "change-role",
  permission: "member.manage",
  input: changeRoleInput,
  run: changeIt,
});

export const removeMember = defineAction({
  name: "remove-member",
  permission: "member.manage",
  input: removeMemberInput,
  run: removeIt,
});

export const leaveProject = defineAction({
  name: "leave-project",
  permission: "membership.leave",
  input: leaveProjectInput,
  run: leaveIt,
});
