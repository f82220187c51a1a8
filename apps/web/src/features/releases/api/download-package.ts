import { downloadPackage } from '@tipward/contract';
import { useMutation } from '@tanstack/react-query';
import { fetchFile } from '../../../lib/api/call-api.ts';
import { saveBlob } from '../../../lib/files/save-file.ts';

/** Fetches the frozen package and hands it to the browser. */
export const useDownloadPackage = () =>
  useMutation({
    mutationFn: async (releaseId: string) => {
      const { blob, fileName } = await fetchFile(downloadPackage, { params: { releaseId } });
      saveBlob(blob, fileName ?? 'release.zip');
    },
  });
