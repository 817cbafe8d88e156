import { useParams } from 'react-router-dom';
import { JobView } from '../features/jobs/components/job-view';

export default function JobPage() {
  const { jobId = '' } = useParams();
  return <JobView key={jobId} jobId={jobId} />;
}
