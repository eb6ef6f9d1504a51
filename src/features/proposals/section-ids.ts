/* Sections of a proposal's sheet. The underscore is in no id of a page, which stands on the same sheet. */

export const notesId = 'the_notes';
export const decisionId = 'the_decision';
