import type { Migration } from './migration.ts';

/**
 * A topic may be merged into another. Sets and answers name the topic they were asked under and are never changed, so
 * the merged topic's row stays and says where it went.
 */
export const topicMerge: Migration = {
  name: '2026-12-01-09-topic-merge',
  up: (run) =>
    run(`
      -- NULL while the topic is one of the specification's. Never a topic that is itself merged.
      ALTER TABLE topics
        ADD COLUMN merged_into_id uuid CHECK (merged_into_id <> id),
        ADD FOREIGN KEY (school_id, merged_into_id) REFERENCES topics (school_id, id),
        DROP CONSTRAINT topics_school_id_specification_id_number_key;
      -- The number of a topic that has been merged is free again.
      CREATE UNIQUE INDEX topics_by_number ON topics (school_id, specification_id, number)
        WHERE merged_into_id IS NULL;
    `),
};
