import { endSentence } from "./words";
import type { Writers } from "./writer";

/** Who is in the project, and the project itself. */
export const PEOPLE: Writers<"project" | "member" | "invitation"> = {
  "project.created": ({ name }, { who }) => [who, ` set up the project ${name}.`],
  "project.edited": ({ what }, { who, project }) => [
    who,
    " changed ",
    project("the project"),
    what === "" ? "." : `: ${endSentence(what)}`,
  ],
  "project.archived": ({ name }, { who }) => [who, ` archived the project ${name}.`],
  "project.restored": ({ name }, { who }) => [who, ` restored the project ${name}.`],
  "member.joined": ({ role }, { who, people }) => [who, " joined ", people("the project"), ` as ${role}.`],
  "member.role-changed": ({ name, from, to }, { who, people }) => [
    who,
    " made ",
    people(name),
    ` ${to}, before ${from}.`,
  ],
  "member.removed": ({ name }, { who, people }) =>
    name === who
      ? [who, " left ", people("the project"), "."]
      : [who, ` removed ${name} from `, people("the project"), "."],
  "invitation.sent": ({ role }, { who, people }) => [who, " invited ", people(`a ${role}`), "."],
  "invitation.withdrawn": ({ role }, { who, people }) => [
    who,
    " withdrew ",
    people(`the invitation of a ${role}`),
    ".",
  ],
};
