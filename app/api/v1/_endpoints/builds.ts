import { buildFilePathSchema, buildSchema } from '../_contracts/build';
import { versionPathSchema } from '../_contracts/version';
import { defineEndpoint } from './Endpoint';

export const readBuildEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}/versions/{number}/build',
  operationId: 'readBuild',
  summary: 'What the build of a version holds; made at the first asking',
  tag: 'builds',
  access: 'signed-in',
  params: versionPathSchema,
  answers: { 200: { description: 'The build.', schema: buildSchema } },
  problems: ['not-found', 'recipe-has-errors'],
});

export const readBuildFileEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}/versions/{number}/build/files/{name}',
  operationId: 'readBuildFile',
  summary: 'One file of a build',
  tag: 'builds',
  access: 'signed-in',
  params: buildFilePathSchema,
  answers: {
    200: {
      description: 'The file, as a download.',
      mediaType: '*/*',
      headers: { ETag: 'SHA-256 of the file.', 'Content-Disposition': 'Name of the file.' },
    },
  },
  problems: ['not-found', 'recipe-has-errors'],
});

export const readBuildArchiveEndpoint = defineEndpoint({
  method: 'get',
  path: '/recipes/{recipeId}/versions/{number}/build/archive',
  operationId: 'readBuildArchive',
  summary: 'All files of a build in one ZIP archive',
  tag: 'builds',
  access: 'signed-in',
  params: versionPathSchema,
  answers: {
    200: {
      description: 'The archive, as a download.',
      mediaType: 'application/zip',
      headers: { ETag: 'Key of the build.', 'Content-Disposition': 'Name of the archive.' },
    },
  },
  problems: ['not-found', 'recipe-has-errors'],
});
