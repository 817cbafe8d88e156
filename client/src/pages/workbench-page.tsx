import { useParams } from 'react-router-dom';
import { RunEditor } from '../features/run-editor/components/run-editor';

export default function WorkbenchPage() {
  const { jobId = '', runId = '' } = useParams();
  return <RunEditor key={runId} jobId={jobId} runId={runId} />;
}
