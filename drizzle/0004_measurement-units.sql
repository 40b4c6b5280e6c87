ALTER TABLE "measurements" ADD COLUMN "radius_unit" text DEFAULT 'kpc' NOT NULL;--> statement-breakpoint
ALTER TABLE "measurements" ADD COLUMN "speed_unit" text DEFAULT 'km/s' NOT NULL;--> statement-breakpoint
ALTER TABLE "measurements" ADD COLUMN "distance" jsonb;--> statement-breakpoint
ALTER TABLE "measurements" ADD COLUMN "inclination" jsonb;