import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { ConnectorFace } from "@/components/ui/glyphs/ConnectorFace";
import { findConnector } from "@/lib/calc/connector";

const NO_PINS: ReadonlySet<string> = new Set();

type Props = { project: string; hasBoards: boolean; canEdit: boolean; onAdd: () => void };

/** How a pin map begins. */
export function NoConnectors({ project, hasBoards, canEdit, onAdd }: Props) {
  const face = findConnector("header-2x10");
  const add = canEdit && hasBoards && (
    <Button kind="primary" onPress={onAdd}>
      Add the first connector
    </Button>
  );
  const boards = !hasBoards && (
    <ButtonLink kind="primary" href={`/projects/${project}/boards`}>
      Add boards first
    </ButtonLink>
  );
  return (
    <EmptyState
      title="No connector yet"
      drawing={face && <ConnectorFace face={face} lit={NO_PINS} label="An empty pin header" className="w-56!" />}
      action={add || boards}
    >
      <p>
        The pin maps of all boards stand here, as tables one edits like a spreadsheet: which signal is on which pin,
        what the pin does, and which logic family stands behind it.
      </p>
      <p className="mt-2">
        Begin with the connectors of the backplane, one for each slot, then the cards. As soon as two boards meet, the
        check says what will not work between them: two drivers on a net, levels that do not fit, a pull-up that is
        missing.
      </p>
    </EmptyState>
  );
}
