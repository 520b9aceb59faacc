import { Button } from "@/components/button";

const PROBLEMS: Readonly<Record<string, string>> = {
  none: "Choose a file first.",
  unreadable: "No column of times with a column of glucose values beside it was found in that file. A text file with both is needed; pictures, documents and archives can’t be read.",
};

/** A plain upload that needs no script; the preview follows on the next page. */
export function UploadForm({ journalId, problem }: Readonly<{ journalId: string; problem?: string }>) {
  const sentence = problem === undefined ? undefined : PROBLEMS[problem];
  return (
    <form action={`/j/${journalId}/data/upload`} method="post" encType="multipart/form-data" className="mt-6 max-w-text">
      {sentence ? (
        <div role="alert" className="mb-4 border-l-4 border-emergency py-1 pl-4">
          <h2 className="text-section">There is a problem</h2>
          <p><a className="link font-semibold text-emergency" href="#file">{sentence}</a></p>
        </div>
      ) : null}
      <label htmlFor="file" className="block font-semibold">A file of glucose readings</label>
      <p id="file-hint" className="text-note text-soft">Any delimited text with a time and a glucose column, up to 32 MB. You see how it is read before anything is stored.</p>
      <input id="file" name="file" type="file" accept=".csv,.tsv,.txt,text/*" aria-describedby="file-hint" className="field mt-2 block w-full" />
      <div className="mt-5"><Button>Look at the file</Button></div>
    </form>
  );
}
