CREATE TABLE "edition_datasets" (
	"edition" integer PRIMARY KEY NOT NULL,
	"measured_from" date NOT NULL,
	"measured_to" date NOT NULL,
	"rows" jsonb NOT NULL
);
--> statement-breakpoint
CREATE TABLE "edition_files" (
	"edition" integer NOT NULL,
	"place" integer NOT NULL,
	"name" text NOT NULL,
	"type" text NOT NULL,
	"sha256" text NOT NULL,
	"bytes" "bytea" NOT NULL,
	CONSTRAINT "edition_files_pkey" PRIMARY KEY("edition","name"),
	CONSTRAINT "edition_files_sha256_of_bytes" CHECK ("edition_files"."sha256" = encode(sha256("edition_files"."bytes"), 'hex')),
	CONSTRAINT "edition_files_name_is_a_file" CHECK ("edition_files"."name" ~ '^[A-Za-z0-9][A-Za-z0-9.-]*$')
);
--> statement-breakpoint
ALTER TABLE "edition_datasets" ADD CONSTRAINT "edition_datasets_edition_editions_number_fk" FOREIGN KEY ("edition") REFERENCES "public"."editions"("number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edition_files" ADD CONSTRAINT "edition_files_edition_edition_datasets_edition_fk" FOREIGN KEY ("edition") REFERENCES "public"."edition_datasets"("edition") ON DELETE no action ON UPDATE no action;