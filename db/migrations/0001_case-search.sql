CREATE VIRTUAL TABLE `case_search` USING fts5(
  scope, ref, job, class, cause, notes,
  content = 'case_texts', content_rowid = 'case_id',
  tokenize = "unicode61 remove_diacritics 2", prefix = '2 3'
);--> statement-breakpoint
CREATE VIRTUAL TABLE `case_words` USING fts5vocab(case_search, 'row');
