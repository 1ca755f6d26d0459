"use server";

import { defineAction } from "@/lib/actions/define-action";
import { addConnector as add } from "@/lib/connector/add-connector";
import { editConnector as edit } from "@/lib/connector/edit-connector";
import { removeConnector as remove } from "@/lib/connector/remove-connector";
import { addConnectorInput, editConnectorInput, removeConnectorInput } from "@/lib/connector/schema";
import { copyPinMap as copy } from "@/lib/pin-map/copy-pin-map";
import { savePinMap as save } from "@/lib/pin-map/save-pin-map";
import { copyPinMapInput, savePinMapInput } from "@/lib/pin-map/schema";

const permission = "wiring.edit";

export const addConnector = defineAction({ name: "add-connector", permission, input: addConnectorInput, run: add });

export const editConnector = defineAction({ name: "edit-connector", permission, input: editConnectorInput, run: edit });

export const removeConnector = defineAction({
  name: "remove-connector",
  permission,
  input: removeConnectorInput,
  run: remove,
});

export const savePinMap = defineAction({ name: "save-pin-map", permission, input: savePinMapInput, run: save });

export const copyPinMap = defineAction({ name: "copy-pin-map", permission, input: copyPinMapInput, run: copy });
