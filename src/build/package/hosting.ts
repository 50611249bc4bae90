// The words that go with a package to whoever hosts it.

import type { InstalledFrom } from "./with-pane";

export const hostingNote = (
  address: string,
  version: string,
  offline: boolean,
  openPane?: InstalledFrom,
): string => `Beadline ${version}

1. Put everything in this folder at ${address}/
   It must be reachable over https with a certificate that the users' machines trust.
2. Serve .js as text/javascript, .json as application/json, .xml as text/xml, .css as text/css, .xlsx as
   application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.
   No header "Content-Security-Policy: frame-ancestors" and no "X-Frame-Options": Excel on the web shows the pane in a frame.
3. Let browsers ask again for each file (Cache-Control: no-cache). Excel itself keeps functions.json for up to a day.
4. Give manifest.xml to the users or to your administrator, who can deploy it for all.
   To try it: Excel on the web, Insert > Add-ins > Upload My Add-in, choose manifest.xml.
5. ${address}/sheet.html is the local sheet: the same functions without Excel.
${openPane ? paneNote(openPane) : ""}${
  offline
    ? "\nThis package carries Office.js (folder office/): no other address is asked for. The vendor supports only the\ncurrent copy at its own address, so make a new package from time to time. Its terms are in office/LICENSE.md.\n"
    : "\nThe pane loads Office.js from its vendor's address, which the users' machines must reach.\nFor a plant without internet make the package with --offline.\n"
}
For records and analysis, never for a safety interlock.
`;

const paneNote = (
  from: InstalledFrom,
): string => `6. The workbooks in samples/with-pane/ open the pane by themselves where the add-in is installed from
   ${from === "central" ? "the administrator's central deployment" : `the shared folder ${from.share}, a trusted catalogue of the user's Excel`}; elsewhere they are like those
   in samples/. They name this version of the add-in: make the package again for the next one.
`;
