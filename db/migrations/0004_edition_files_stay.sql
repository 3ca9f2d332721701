-- A released data set never changes, whichever client asks.
CREATE TRIGGER edition_datasets_stay BEFORE UPDATE OR DELETE OR TRUNCATE ON edition_datasets FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('a released data set never changes');
--> statement-breakpoint
CREATE TRIGGER edition_files_stay BEFORE UPDATE OR DELETE OR TRUNCATE ON edition_files FOR EACH STATEMENT EXECUTE FUNCTION refuse_change('a released data set never changes');
