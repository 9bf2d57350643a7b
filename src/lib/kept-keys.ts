/** Name of the browser's database on a person's own device. */
export const DATABASE = 'plait';

/** Where the answers of one person's set wait until the server has them. */
export const answersPrefix = (userId: string, setId: string): string => `plait.answers.${userId}.${setId}.`;

/** Where the drafts of one person's set are. */
export const draftsPrefix = (userId: string, setId: string): string => `plait.draft.${userId}.${setId}.`;

/** Where answers stay that the server refused after their set was left, until the student has read why. */
export const refusedPrefix = (userId: string): string => `plait.refused.${userId}.`;
