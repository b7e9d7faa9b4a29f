/** What a translator of the sheet must know; apart from the sheet itself, so that a page naming them loads no core. */
export const sheetNamespaces = ["common", "sheet", "anchors", "cautions"] as const;
export const sheetKeys = ["common.name", "common.lean.", "common.sourceStatus.", "common.cautionsTitle", "sheet.", "anchors.code.", "anchors.findings.", "anchors.remedy.", "anchors.rule.", "anchors.figure.", "anchors.additions.", "anchors.table.", "cautions."] as const;
