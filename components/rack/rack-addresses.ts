export const unitAddress = (project: string, serial: string) =>
  `/projects/${project}/units/${encodeURIComponent(serial)}`;
export const benchAddress = (project: string, serial: string, checkId: string) =>
  `/projects/${project}/bench/${encodeURIComponent(serial)}?check=${checkId}`;
export const boardsAddress = (project: string) => `/projects/${project}/boards`;
export const slotAddress = (project: string, position: number) => `/projects/${project}/boards#slot-${position}`;
export const boardAddress = (project: string, code: string) =>
  `/projects/${project}/boards/${encodeURIComponent(code)}`;
