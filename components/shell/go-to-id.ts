/** Ties the "Go to" button to its sheet. */
export const GO_TO_ID = "go-to";
