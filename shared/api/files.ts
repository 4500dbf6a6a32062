import { z } from "zod";
import { type Contract, noInput } from "./contract.ts";

export const FileDto = z.object({ fileId: z.uuid(), url: z.string(), width: z.int(), height: z.int() });
export type FileDto = z.infer<typeof FileDto>;

/** The one endpoint that takes multipart/form-data: the photo is in the part named `photo`. */
export const uploadPhoto = {
  method: "POST",
  path: "/api/office/photos",
  summary: "Add a photo: re-encoded, its metadata stripped",
  makes: true,
  input: noInput,
  output: FileDto,
} as const satisfies Contract;
