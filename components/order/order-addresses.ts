export const benchHref = (project: string, serial: string, checkId: string) =>
  `/projects/${project}/bench/${encodeURIComponent(serial)}?check=${checkId}`;

export const checkHref = (project: string, serial: string, checkId: string) =>
  `/projects/${project}/units/${encodeURIComponent(serial)}?check=${checkId}#check-${checkId}`;

export const boardHref = (project: string, code: string) => `/projects/${project}/boards/${encodeURIComponent(code)}`;
