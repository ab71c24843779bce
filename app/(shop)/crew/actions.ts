"use server";

import { changeRolesInput, inviteIdInput, inviteInput, removeMemberInput } from "@/lib/crew/crew.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import { invite, inviteAgain, revokeInvite } from "@/lib/server/crew/invites";
import { changeRoles, removeMember } from "@/lib/server/crew/members";

const showing = () => [routes.crew(), routes.audit(), routes.outbox()];

export const invitePerson = act({
  permission: "crew.manage",
  input: inviteInput,
  run: ({ db, member, input, now }) => invite(db, member, input, now),
  revalidate: showing,
});

export const sendInviteAgain = act({
  permission: "crew.manage",
  input: inviteIdInput,
  run: ({ db, member, input, now }) => inviteAgain(db, member, input.inviteId, now),
  revalidate: showing,
});

export const takeInviteBack = act({
  permission: "crew.manage",
  input: inviteIdInput,
  run: ({ db, member, input, now }) => revokeInvite(db, member, input.inviteId, now),
  revalidate: showing,
});

export const changeMemberRoles = act({
  permission: "crew.manage",
  input: changeRolesInput,
  run: ({ db, member, input, now }) => changeRoles(db, member, input, now),
  revalidate: showing,
});

export const removeFromCrew = act({
  permission: "crew.manage",
  input: removeMemberInput,
  run: ({ db, member, input, now }) => removeMember(db, member, input.memberId, now),
  revalidate: showing,
});
