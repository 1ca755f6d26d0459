import { receiveUploadRequest } from "@/lib/attachment/upload-handler";

export const POST = receiveUploadRequest;
