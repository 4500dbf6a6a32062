import { z } from "zod";
import { limits } from "../limits.ts";
import {
  type Contract,
  idInput,
  instant,
  noInput,
  okDto,
  required,
  slugText,
  text,
  versionNumber,
} from "./contract.ts";

export const topics = ["fresh", "growing"] as const;
export const PhotoDto = z.object({
  fileId: z.uuid(),
  url: z.string(),
  width: z.int(),
  height: z.int(),
  alt: z.string(),
});

export const PostSummaryDto = z.object({
  slug: z.string(),
  title: z.string(),
  topic: z.enum(topics),
  excerpt: z.string(),
  postedAt: instant,
  photo: PhotoDto.nullable(),
  varieties: z.array(z.object({ slug: z.string(), name: z.string() })),
});
export type PostSummaryDto = z.infer<typeof PostSummaryDto>;
/** `html` is rendered on the server from Markdown without raw HTML. */
export const PostDto = PostSummaryDto.extend({ html: z.string(), photos: z.array(PhotoDto), authorName: z.string() });
export type PostDto = z.infer<typeof PostDto>;

export const listPosts = {
  method: "GET",
  path: "/api/notebook",
  summary: "The notebook, newest first",
  isPublic: true,
  sharedForMs: 400,
  input: z.object({ page: z.coerce.number().int().min(1).max(1_000).default(1) }),
  output: z.object({ posts: z.array(PostSummaryDto), page: z.int(), pages: z.int() }),
} as const satisfies Contract;
export const getPost = {
  method: "GET",
  path: "/api/notebook/:slug",
  summary: "One post",
  isPublic: true,
  sharedForMs: 400,
  input: z.object({ slug: slugText }),
  output: PostDto,
} as const satisfies Contract;

const postFields = {
  title: required(limits.titleMax),
  topic: z.enum(topics),
  markdown: text(limits.markdownMax),
  varietyIds: z.array(z.uuid()).max(24),
  photos: z
    .array(
      z.object({
        fileId: z.uuid(),
        alt: required(limits.lineMax, "Say what the photo shows, for those who cannot see it."),
      }),
    )
    .max(limits.photosPerPostMax),
};
export const OfficePostDto = z.object({
  id: z.uuid(),
  slug: z.string(),
  title: z.string(),
  topic: z.enum(topics),
  markdown: z.string(),
  varietyIds: z.array(z.uuid()),
  photos: z.array(PhotoDto),
  postedAt: instant.nullable(),
  changedAt: instant,
  version: versionNumber,
});
export type OfficePostDto = z.infer<typeof OfficePostDto>;

export const listOfficePosts = {
  method: "GET",
  path: "/api/office/notebook",
  summary: "All posts, drafts too",
  input: noInput,
  output: z.array(OfficePostDto),
} as const satisfies Contract;
export const createPost = {
  method: "POST",
  path: "/api/office/notebook",
  summary: "Write a post",
  makes: true,
  input: z.object(postFields),
  output: OfficePostDto,
} as const satisfies Contract;
export const updatePost = {
  method: "PUT",
  path: "/api/office/notebook/:id",
  summary: "Change a post",
  input: idInput.extend({ ...postFields, version: versionNumber }),
  output: OfficePostDto,
} as const satisfies Contract;
export const publishPost = {
  method: "POST",
  path: "/api/office/notebook/:id/publish",
  summary: "Make a post public, or take it back",
  input: idInput.extend({ isPublic: z.boolean(), version: versionNumber }),
  output: OfficePostDto,
} as const satisfies Contract;
export const deletePost = {
  method: "DELETE",
  path: "/api/office/notebook/:id",
  summary: "Delete a post",
  input: idInput,
  output: okDto,
} as const satisfies Contract;
