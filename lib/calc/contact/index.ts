export { contactCurrentA, TWO_PART_DERATING, type DeratingPoint } from "./derating";
export {
  CONTACT_OHM,
  contactDrop,
  judgeContacts,
  loopDropVolts,
  type ContactDrop,
  type ContactJudgement,
  type ContactRow,
} from "./drop";
