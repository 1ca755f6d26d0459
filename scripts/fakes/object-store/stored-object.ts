import { z } from "zod";

export const aclSchema = z.enum(["public-read", "private"]);

/** What is known of one stored file. */
export const storedObjectSchema = z.object({
  key: z.string(),
  name: z.string(),
  size: z.number(),
  type: z.string(),
  customId: z.string().nullable(),
  acl: aclSchema,
  contentDisposition: z.enum(["inline", "attachment"]),
  /** MD5 in hex, as the SDK documents it. */
  fileHash: z.string(),
  uploadedAt: z.number(),
});

export type StoredObject = z.infer<typeof storedObjectSchema>;

/** What a signed upload address says about the file. */
export const uploadClaimSchema = z.object({
  key: z.string().min(1).max(300),
  appId: z.string(),
  name: z.string().min(1).max(1024),
  size: z.coerce.number().int().min(0).max(1_000_000_000),
  type: z.string().max(255).default("application/octet-stream"),
  slug: z.string().optional(),
  customId: z.string().optional(),
  contentDisposition: z.enum(["inline", "attachment"]).default("inline"),
  acl: aclSchema.default("public-read"),
});

export type UploadClaim = z.infer<typeof uploadClaimSchema>;
