import { describe, expect, it } from "vitest";
import { can, PERMISSIONS, type Permission } from "@/lib/access/permissions";
import { MAY, ROLES } from "./permission-table";

// The keys of a Record of every permission are the permissions.
const permissions = Object.keys(MAY) as Permission[];

describe("The permission table", () => {
  it("holds the permissions of the design and no other", () => {
    expect(Object.keys(PERMISSIONS).sort()).toEqual(permissions.toSorted());
  });

  describe.each(permissions)("%s", (permission) => {
    it.each(ROLES)(`is for a %s as the design says`, (role) => {
      expect(can(role, permission)).toBe(MAY[permission].includes(role));
    });

    it("is nothing for somebody who is no member", () => {
      expect(can(undefined, permission)).toBe(false);
    });
  });

  it("denies what is not listed", () => {
    // A name from outside the table, as a mistake in a row of the database would bring it.
    expect(can("owner" as never, "project.see")).toBe(false);
  });
});
