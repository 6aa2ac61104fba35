CREATE TABLE "certificate" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"subject" text NOT NULL,
	"number" text NOT NULL,
	"revision" integer DEFAULT 0 NOT NULL,
	"replaces_id" uuid,
	"state" text DEFAULT 'live' NOT NULL,
	"record" jsonb NOT NULL,
	"hash" text NOT NULL,
	"previous_hash" text NOT NULL,
	"chain_number" integer NOT NULL,
	"seal" text NOT NULL,
	"seal_key_id" uuid NOT NULL,
	"words" text NOT NULL,
	"sealed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "certificate_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "certificate_hash_once" UNIQUE("hash"),
	CONSTRAINT "certificate_number_once" UNIQUE("firm_id","number","revision"),
	CONSTRAINT "certificate_chain_once" UNIQUE("firm_id","chain_number"),
	CONSTRAINT "certificate_kind_known" CHECK ("certificate"."kind" in ('installation','minor-works')),
	CONSTRAINT "certificate_state_known" CHECK ("certificate"."state" in ('live','replaced'))
);
--> statement-breakpoint
CREATE TABLE "paper" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"source_id" uuid NOT NULL,
	"state" text DEFAULT 'to-make' NOT NULL,
	"sha256" text,
	"pages" integer,
	"problem" text,
	"is_draft" boolean DEFAULT false NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "paper_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "seal_key" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"public_key" text NOT NULL,
	"encrypted_private_key" text NOT NULL,
	"valid_from" timestamp with time zone DEFAULT now() NOT NULL,
	"valid_to" timestamp with time zone,
	CONSTRAINT "seal_key_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "signature" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"capacity" text NOT NULL,
	"person_id" uuid NOT NULL,
	"name_shown" text NOT NULL,
	"way" text NOT NULL,
	"statement" text NOT NULL,
	"edition" text NOT NULL,
	"record_version" integer NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"withdrawn_at" timestamp with time zone,
	CONSTRAINT "signature_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "signature_capacity_known" CHECK ("signature"."capacity" in ('designer','constructor','inspector','supervisor'))
);
--> statement-breakpoint
CREATE TABLE "customer" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"email" text DEFAULT '' NOT NULL,
	"telephone" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "customer_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "premises" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"customer_id" uuid NOT NULL,
	"address" text DEFAULT '' NOT NULL,
	"town" text DEFAULT '' NOT NULL,
	"postcode" text DEFAULT '' NOT NULL,
	"country" text DEFAULT 'England' NOT NULL,
	"mpan" text DEFAULT '' NOT NULL,
	"occupier" text DEFAULT '' NOT NULL,
	"tenure" text DEFAULT '' NOT NULL,
	"parking" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "premises_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "crew" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	CONSTRAINT "crew_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "crew_name_once" UNIQUE("firm_id","name")
);
--> statement-breakpoint
CREATE TABLE "device" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"last_seen_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "device_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "firm" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"address" text NOT NULL,
	"telephone" text NOT NULL,
	"email" text NOT NULL,
	"country" text DEFAULT 'England' NOT NULL,
	"scheme" text DEFAULT '' NOT NULL,
	"registration" text DEFAULT '' NOT NULL,
	"certificate_prefix" text NOT NULL,
	"vat_number" text,
	"settings" jsonb NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "membership" (
	"firm_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"roles" text[] NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	"crew_id" uuid,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "membership_firm_id_person_id_pk" PRIMARY KEY("firm_id","person_id"),
	CONSTRAINT "membership_roles_known" CHECK ("membership"."roles" <@ array['office','installer','supervisor','principal']::text[])
);
--> statement-breakpoint
CREATE TABLE "person" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"telephone" text,
	"password_hash" text,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "person_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "person_token" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"purpose" text NOT NULL,
	"token_hash" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "person_token_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "person_token_hash_once" UNIQUE("token_hash"),
	CONSTRAINT "person_token_purpose_known" CHECK ("person_token"."purpose" in ('invitation','password-reset'))
);
--> statement-breakpoint
CREATE TABLE "qualification" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"title" text NOT NULL,
	"number" text DEFAULT '' NOT NULL,
	"capacities" text[] NOT NULL,
	"valid_to" date,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "qualification_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "rate_limit" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "sign_in_session" (
	"firm_id" uuid NOT NULL,
	"id" text NOT NULL,
	"person_id" uuid NOT NULL,
	"user_agent" text DEFAULT '' NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"revoked_at" timestamp with time zone,
	CONSTRAINT "sign_in_session_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "sign_in_session_id_once" UNIQUE("id")
);
--> statement-breakpoint
CREATE TABLE "counter" (
	"firm_id" uuid NOT NULL,
	"name" text NOT NULL,
	"last" integer DEFAULT 0 NOT NULL,
	CONSTRAINT "counter_firm_id_name_pk" PRIMARY KEY("firm_id","name")
);
--> statement-breakpoint
CREATE TABLE "field_query" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"part" text NOT NULL,
	"field" text NOT NULL,
	"question" text NOT NULL,
	"asked_by" uuid NOT NULL,
	"asked_at" timestamp with time zone DEFAULT now() NOT NULL,
	"answer" text,
	"answered_by" uuid,
	"answered_at" timestamp with time zone,
	CONSTRAINT "field_query_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "job" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"ref" text NOT NULL,
	"customer_id" uuid NOT NULL,
	"premises_id" uuid NOT NULL,
	"stage" text NOT NULL,
	"stage_since" timestamp with time zone DEFAULT now() NOT NULL,
	"side_state" text,
	"side_note" text DEFAULT '' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"with_whom" text DEFAULT 'office' NOT NULL,
	"next_day" date,
	"record_version" bigint DEFAULT 1 NOT NULL,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "job_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "job_ref_once" UNIQUE("firm_id","ref"),
	CONSTRAINT "job_stage_known" CHECK ("job"."stage" in ('enquiry','survey-booked','surveyed','quoted','accepted','install-booked','on-site','ready-to-check','countersigned','handed-over','closed'))
);
--> statement-breakpoint
CREATE TABLE "mutation_record" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kind" text NOT NULL,
	"job_id" uuid,
	"person_id" uuid,
	"content_hash" text NOT NULL,
	"outcome" jsonb,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "mutation_record_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "visit" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"day" date NOT NULL,
	"half" text NOT NULL,
	"crew_id" uuid NOT NULL,
	"hours" integer DEFAULT 3 NOT NULL,
	"state" text DEFAULT 'booked' NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "visit_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "visit_half_known" CHECK ("visit"."half" in ('am','pm')),
	CONSTRAINT "visit_kind_known" CHECK ("visit"."kind" in ('survey','install','return')),
	CONSTRAINT "visit_state_known" CHECK ("visit"."state" in ('booked','done','cancelled'))
);
--> statement-breakpoint
CREATE TABLE "audit_event" (
	"firm_id" uuid NOT NULL,
	"number" bigint NOT NULL,
	"job_id" uuid,
	"person_id" uuid,
	"type" text NOT NULL,
	"detail" jsonb NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"previous_hash" text NOT NULL,
	"hash" text NOT NULL,
	CONSTRAINT "audit_event_firm_id_number_pk" PRIMARY KEY("firm_id","number")
);
--> statement-breakpoint
CREATE TABLE "audit_head" (
	"firm_id" uuid PRIMARY KEY NOT NULL,
	"number" bigint DEFAULT 0 NOT NULL,
	"hash" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "customer_link" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"purpose" text NOT NULL,
	"subject_id" uuid,
	"token_hash" text NOT NULL,
	"sent_to" text NOT NULL,
	"expires_at" timestamp with time zone,
	"withdrawn_at" timestamp with time zone,
	"opened_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "customer_link_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "customer_link_hash_once" UNIQUE("token_hash"),
	CONSTRAINT "customer_link_purpose_known" CHECK ("customer_link"."purpose" in ('photographs','quote','visit','pack'))
);
--> statement-breakpoint
CREATE TABLE "outbox_message" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid,
	"message" text NOT NULL,
	"recipient" text NOT NULL,
	"content" jsonb NOT NULL,
	"dedupe_key" text NOT NULL,
	"state" text DEFAULT 'queued' NOT NULL,
	"waits_for_paper" uuid,
	"attempts" integer DEFAULT 0 NOT NULL,
	"message_id" text NOT NULL,
	"claimed_at" timestamp with time zone,
	"next_try_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp with time zone,
	"problem" text,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "outbox_message_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "outbox_dedupe_once" UNIQUE("firm_id","dedupe_key"),
	CONSTRAINT "outbox_state_known" CHECK ("outbox_message"."state" in ('queued','claimed','sent','failed','unclear'))
);
--> statement-breakpoint
CREATE TABLE "outside_event" (
	"firm_id" uuid NOT NULL,
	"id" text NOT NULL,
	"kind" text NOT NULL,
	"content" jsonb NOT NULL,
	"handled_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "outside_event_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "retention_rule" (
	"firm_id" uuid NOT NULL,
	"subject" text NOT NULL,
	"years" integer NOT NULL,
	"ground" text NOT NULL,
	"since" date NOT NULL,
	CONSTRAINT "retention_rule_firm_id_subject_pk" PRIMARY KEY("firm_id","subject")
);
--> statement-breakpoint
CREATE TABLE "table_confirmation" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"table_id" text NOT NULL,
	"row_key" text NOT NULL,
	"way" text NOT NULL,
	"value" jsonb,
	"reason" text DEFAULT '' NOT NULL,
	"source" text DEFAULT '' NOT NULL,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "table_confirmation_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "table_confirmation_way_known" CHECK ("table_confirmation"."way" in ('seen','override'))
);
--> statement-breakpoint
CREATE TABLE "checkout" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"quote_id" uuid NOT NULL,
	"outside_id" text,
	"pence" integer NOT NULL,
	"url" text,
	"state" text DEFAULT 'open' NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "checkout_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "checkout_outside_once" UNIQUE("outside_id")
);
--> statement-breakpoint
CREATE TABLE "invoice" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"number" text NOT NULL,
	"kind" text NOT NULL,
	"state" text DEFAULT 'sent' NOT NULL,
	"content" jsonb NOT NULL,
	"gross_pence" integer NOT NULL,
	"due_pence" integer NOT NULL,
	"issued_on" date NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "invoice_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "invoice_number_once" UNIQUE("firm_id","number")
);
--> statement-breakpoint
CREATE TABLE "payment" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"quote_id" uuid,
	"invoice_id" uuid,
	"pence" integer NOT NULL,
	"currency" text DEFAULT 'gbp' NOT NULL,
	"way" text NOT NULL,
	"outside_id" text NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "payment_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "payment_outside_once" UNIQUE("firm_id","outside_id")
);
--> statement-breakpoint
CREATE TABLE "price_item" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"code" text NOT NULL,
	"description" text NOT NULL,
	"unit" text NOT NULL,
	"net_pence" integer NOT NULL,
	"vat_bp" integer DEFAULT 2000 NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	CONSTRAINT "price_item_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "price_code_once" UNIQUE("firm_id","code")
);
--> statement-breakpoint
CREATE TABLE "quote" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"number" text NOT NULL,
	"state" text DEFAULT 'draft' NOT NULL,
	"expires_on" date,
	"terms" text DEFAULT '' NOT NULL,
	"net_pence" integer DEFAULT 0 NOT NULL,
	"vat_pence" integer DEFAULT 0 NOT NULL,
	"gross_pence" integer DEFAULT 0 NOT NULL,
	"deposit_pence" integer DEFAULT 0 NOT NULL,
	"sent_at" timestamp with time zone,
	"accepted_at" timestamp with time zone,
	"accepted_name" text,
	"declined_at" timestamp with time zone,
	"declined_reason" text,
	"version" integer DEFAULT 1 NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "quote_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "quote_number_once" UNIQUE("firm_id","number"),
	CONSTRAINT "quote_state_known" CHECK ("quote"."state" in ('draft','sent','accepted','declined','expired','replaced'))
);
--> statement-breakpoint
CREATE TABLE "quote_line" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"quote_id" uuid NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"description" text NOT NULL,
	"quantity_thousandths" integer NOT NULL,
	"unit" text NOT NULL,
	"unit_net_pence" integer NOT NULL,
	"vat_bp" integer NOT NULL,
	CONSTRAINT "quote_line_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "notice" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"recipient" text NOT NULL,
	"route" text NOT NULL,
	"reasons" jsonb NOT NULL,
	"last_day" date,
	"state" text DEFAULT 'to-prepare' NOT NULL,
	"content" jsonb NOT NULL,
	"sent_on" date,
	"sent_by" uuid,
	"sent_how" text,
	"reference" text DEFAULT '' NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "notice_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "notice_state_known" CHECK ("notice"."state" in ('not-needed','to-prepare','sent','answered'))
);
--> statement-breakpoint
CREATE TABLE "notice_reply" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"notice_id" uuid NOT NULL,
	"outcome" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"replied_on" date NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "notice_reply_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "appliance" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "appliance_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "circuit" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "circuit_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "consent" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "consent_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "departure" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "departure_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "earthing_decision" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "earthing_decision_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "equipment_fitted" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "equipment_fitted_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "handover" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "handover_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "inspection_outcome" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "inspection_outcome_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "leg" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "leg_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "load_limit" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "load_limit_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "promise" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "promise_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "put_back_item" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "put_back_item_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "recorded_demand" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "recorded_demand_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "statement" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "statement_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "survey_answer" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "survey_answer_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "unexpected_sentence" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "unexpected_sentence_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "wanted" (
	"firm_id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"key" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"content" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"stamps" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"removed_at" timestamp with time zone,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "wanted_firm_id_job_id_key_pk" PRIMARY KEY("firm_id","job_id","key")
);
--> statement-breakpoint
CREATE TABLE "calibration" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"instrument_id" uuid NOT NULL,
	"done_on" date NOT NULL,
	"good_until" date NOT NULL,
	"reference" text DEFAULT '' NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "calibration_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "calibration_days_in_order" CHECK ("calibration"."good_until" >= "calibration"."done_on")
);
--> statement-breakpoint
CREATE TABLE "instrument" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"description" text DEFAULT '' NOT NULL,
	"serial" text NOT NULL,
	"functions" text[] NOT NULL,
	"active" boolean DEFAULT true NOT NULL,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "instrument_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "photograph" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"claim" text NOT NULL,
	"sha256" text NOT NULL,
	"taken_at" timestamp with time zone NOT NULL,
	"person_id" uuid,
	"server_at" timestamp with time zone DEFAULT now() NOT NULL,
	"removed_at" timestamp with time zone,
	CONSTRAINT "photograph_firm_id_id_pk" PRIMARY KEY("firm_id","id")
);
--> statement-breakpoint
CREATE TABLE "reading" (
	"firm_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"job_id" uuid NOT NULL,
	"test" text NOT NULL,
	"kind" text NOT NULL,
	"shown" text NOT NULL,
	"value" double precision,
	"unit" text NOT NULL,
	"resolution" double precision,
	"reason" text DEFAULT '' NOT NULL,
	"context" jsonb DEFAULT '{}'::jsonb NOT NULL,
	"instrument_id" uuid,
	"person_id" uuid NOT NULL,
	"typed_by" uuid,
	"device_id" uuid,
	"device_at" timestamp with time zone NOT NULL,
	"server_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reading_firm_id_id_pk" PRIMARY KEY("firm_id","id"),
	CONSTRAINT "reading_kind_known" CHECK ("reading"."kind" in ('value','over-range','limited','not-applicable','seen')),
	CONSTRAINT "reading_value_has_number" CHECK (("reading"."kind" <> 'value') or ("reading"."value" is not null)),
	CONSTRAINT "reading_excuse_has_reason" CHECK (("reading"."kind" not in ('limited','not-applicable')) or ("reading"."reason" <> ''))
);
--> statement-breakpoint
CREATE TABLE "reading_confirmation" (
	"firm_id" uuid NOT NULL,
	"reading_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reading_confirmation_firm_id_reading_id_pk" PRIMARY KEY("firm_id","reading_id")
);
--> statement-breakpoint
CREATE TABLE "stored_file" (
	"firm_id" uuid NOT NULL,
	"sha256" text NOT NULL,
	"media_type" text NOT NULL,
	"bytes" double precision NOT NULL,
	"thumb_sha256" text,
	"made_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "stored_file_firm_id_sha256_pk" PRIMARY KEY("firm_id","sha256")
);
--> statement-breakpoint
ALTER TABLE "certificate" ADD CONSTRAINT "certificate_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "certificate" ADD CONSTRAINT "certificate_firm_id_seal_key_id_seal_key_firm_id_id_fk" FOREIGN KEY ("firm_id","seal_key_id") REFERENCES "public"."seal_key"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "paper" ADD CONSTRAINT "paper_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "seal_key" ADD CONSTRAINT "seal_key_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signature" ADD CONSTRAINT "signature_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signature" ADD CONSTRAINT "signature_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customer" ADD CONSTRAINT "customer_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "premises" ADD CONSTRAINT "premises_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "premises" ADD CONSTRAINT "premises_firm_id_customer_id_customer_firm_id_id_fk" FOREIGN KEY ("firm_id","customer_id") REFERENCES "public"."customer"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "crew" ADD CONSTRAINT "crew_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "device" ADD CONSTRAINT "device_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "membership" ADD CONSTRAINT "membership_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "person" ADD CONSTRAINT "person_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "person_token" ADD CONSTRAINT "person_token_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "qualification" ADD CONSTRAINT "qualification_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_in_session" ADD CONSTRAINT "sign_in_session_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "counter" ADD CONSTRAINT "counter_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "field_query" ADD CONSTRAINT "field_query_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "field_query" ADD CONSTRAINT "field_query_firm_id_asked_by_person_firm_id_id_fk" FOREIGN KEY ("firm_id","asked_by") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job" ADD CONSTRAINT "job_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job" ADD CONSTRAINT "job_firm_id_customer_id_customer_firm_id_id_fk" FOREIGN KEY ("firm_id","customer_id") REFERENCES "public"."customer"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "job" ADD CONSTRAINT "job_firm_id_premises_id_premises_firm_id_id_fk" FOREIGN KEY ("firm_id","premises_id") REFERENCES "public"."premises"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mutation_record" ADD CONSTRAINT "mutation_record_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit" ADD CONSTRAINT "visit_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "visit" ADD CONSTRAINT "visit_firm_id_crew_id_crew_firm_id_id_fk" FOREIGN KEY ("firm_id","crew_id") REFERENCES "public"."crew"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "audit_event" ADD CONSTRAINT "audit_event_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "audit_head" ADD CONSTRAINT "audit_head_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "customer_link" ADD CONSTRAINT "customer_link_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "outbox_message" ADD CONSTRAINT "outbox_message_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "outside_event" ADD CONSTRAINT "outside_event_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "retention_rule" ADD CONSTRAINT "retention_rule_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "table_confirmation" ADD CONSTRAINT "table_confirmation_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "checkout" ADD CONSTRAINT "checkout_firm_id_quote_id_quote_firm_id_id_fk" FOREIGN KEY ("firm_id","quote_id") REFERENCES "public"."quote"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "invoice" ADD CONSTRAINT "invoice_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "payment" ADD CONSTRAINT "payment_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "price_item" ADD CONSTRAINT "price_item_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "quote" ADD CONSTRAINT "quote_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "quote_line" ADD CONSTRAINT "quote_line_firm_id_quote_id_quote_firm_id_id_fk" FOREIGN KEY ("firm_id","quote_id") REFERENCES "public"."quote"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice" ADD CONSTRAINT "notice_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice_reply" ADD CONSTRAINT "notice_reply_firm_id_notice_id_notice_firm_id_id_fk" FOREIGN KEY ("firm_id","notice_id") REFERENCES "public"."notice"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "appliance" ADD CONSTRAINT "appliance_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "circuit" ADD CONSTRAINT "circuit_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "consent" ADD CONSTRAINT "consent_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "departure" ADD CONSTRAINT "departure_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "earthing_decision" ADD CONSTRAINT "earthing_decision_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "equipment_fitted" ADD CONSTRAINT "equipment_fitted_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "handover" ADD CONSTRAINT "handover_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "inspection_outcome" ADD CONSTRAINT "inspection_outcome_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "leg" ADD CONSTRAINT "leg_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "load_limit" ADD CONSTRAINT "load_limit_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "promise" ADD CONSTRAINT "promise_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "put_back_item" ADD CONSTRAINT "put_back_item_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "recorded_demand" ADD CONSTRAINT "recorded_demand_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "statement" ADD CONSTRAINT "statement_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_answer" ADD CONSTRAINT "survey_answer_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "unexpected_sentence" ADD CONSTRAINT "unexpected_sentence_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wanted" ADD CONSTRAINT "wanted_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibration" ADD CONSTRAINT "calibration_firm_id_instrument_id_instrument_firm_id_id_fk" FOREIGN KEY ("firm_id","instrument_id") REFERENCES "public"."instrument"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "instrument" ADD CONSTRAINT "instrument_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photograph" ADD CONSTRAINT "photograph_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photograph" ADD CONSTRAINT "photograph_firm_id_sha256_stored_file_firm_id_sha256_fk" FOREIGN KEY ("firm_id","sha256") REFERENCES "public"."stored_file"("firm_id","sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_firm_id_job_id_job_firm_id_id_fk" FOREIGN KEY ("firm_id","job_id") REFERENCES "public"."job"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading" ADD CONSTRAINT "reading_firm_id_instrument_id_instrument_firm_id_id_fk" FOREIGN KEY ("firm_id","instrument_id") REFERENCES "public"."instrument"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading_confirmation" ADD CONSTRAINT "reading_confirmation_firm_id_reading_id_reading_firm_id_id_fk" FOREIGN KEY ("firm_id","reading_id") REFERENCES "public"."reading"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reading_confirmation" ADD CONSTRAINT "reading_confirmation_firm_id_person_id_person_firm_id_id_fk" FOREIGN KEY ("firm_id","person_id") REFERENCES "public"."person"("firm_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "stored_file" ADD CONSTRAINT "stored_file_firm_id_firm_id_fk" FOREIGN KEY ("firm_id") REFERENCES "public"."firm"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "certificate_live_once" ON "certificate" USING btree ("firm_id","job_id","kind","subject") WHERE "certificate"."state" = 'live';--> statement-breakpoint
CREATE UNIQUE INDEX "paper_once" ON "paper" USING btree ("firm_id","kind","source_id");--> statement-breakpoint
CREATE UNIQUE INDEX "signature_standing_once" ON "signature" USING btree ("firm_id","job_id","capacity") WHERE "signature"."withdrawn_at" is null;--> statement-breakpoint
CREATE INDEX "premises_postcode" ON "premises" USING btree ("firm_id","postcode");--> statement-breakpoint
CREATE UNIQUE INDEX "person_email_once" ON "person" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "job_newest" ON "job" USING btree ("firm_id","changed_at" DESC NULLS LAST,"id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "job_by_stage" ON "job" USING btree ("firm_id","stage","changed_at" DESC NULLS LAST,"id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "visit_by_day" ON "visit" USING btree ("firm_id","day");--> statement-breakpoint
CREATE INDEX "visit_by_job" ON "visit" USING btree ("firm_id","job_id");--> statement-breakpoint
CREATE INDEX "audit_by_job" ON "audit_event" USING btree ("firm_id","job_id","number" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "outbox_to_send" ON "outbox_message" USING btree ("next_try_at") WHERE "outbox_message"."state" = 'queued';--> statement-breakpoint
CREATE INDEX "outbox_by_job" ON "outbox_message" USING btree ("firm_id","job_id");--> statement-breakpoint
CREATE INDEX "notice_by_day" ON "notice" USING btree ("firm_id","state","last_day");--> statement-breakpoint
CREATE INDEX "photograph_by_job" ON "photograph" USING btree ("firm_id","job_id");--> statement-breakpoint
CREATE INDEX "reading_by_job" ON "reading" USING btree ("firm_id","job_id","server_at");