// Files go through the S3 API, to whichever object store the environment names.

import type { Readable } from "node:stream";
import { GetObjectCommand, PutObjectCommand, S3Client } from "@aws-sdk/client-s3";
import type { StorageSettings } from "../env.ts";
import { ServiceError } from "../http/problems.ts";

export interface StoredFile {
  readonly key: string;
  readonly contentType: string;
  readonly bytes: Buffer;
}

export interface Storage {
  readonly put: (file: StoredFile) => Promise<void>;
  readonly open: (key: string) => Promise<Readable>;
  readonly close: () => void;
}

const CONNECT_TIMEOUT_MS = 3000;
const ANSWER_TIMEOUT_MS = 30_000;

export function createStorage(settings: StorageSettings): Storage {
  // It warns that its releases from 2027 on need a newer Node.js; ours is pinned to one that does not.
  process.env.AWS_SDK_JS_NODE_VERSION_SUPPORT_WARNING_DISABLED ??= "true";
  const client = new S3Client({
    endpoint: settings.S3_ENDPOINT,
    region: settings.S3_REGION,
    credentials: {
      accessKeyId: settings.S3_ACCESS_KEY_ID,
      secretAccessKey: settings.S3_SECRET_ACCESS_KEY,
    },
    forcePathStyle: true,
    // Stores that do not know the newer checksums would keep them as part of the file.
    requestChecksumCalculation: "WHEN_REQUIRED",
    responseChecksumValidation: "WHEN_REQUIRED",
    requestHandler: { connectionTimeout: CONNECT_TIMEOUT_MS, requestTimeout: ANSWER_TIMEOUT_MS },
  });
  const bucket = { Bucket: settings.S3_BUCKET };
  return {
    async put({ key, contentType, bytes }) {
      await client.send(new PutObjectCommand({ ...bucket, Key: key, ContentType: contentType, Body: bytes }));
    },
    async open(key) {
      const answer = await client
        .send(new GetObjectCommand({ ...bucket, Key: key }))
        .catch((cause: unknown) => Promise.reject(storeAway(cause)));
      return answer.Body as Readable; // in Node.js the SDK answers with a stream of Node's own kind
    },
    close: () => client.destroy(),
  };
}

function storeAway(cause: unknown): ServiceError {
  const error = new ServiceError("unavailable", {
    detail: "The file store does not answer. The file is not lost: try again in a few seconds.",
    retryAfterSeconds: 5,
  });
  error.cause = cause;
  return error;
}
