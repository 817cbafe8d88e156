import { CompanyPanel } from '../features/company/components/company-panel';
import { usePageTitle } from '../hooks/use-page-title';
import { useWords } from '../hooks/use-words';

export default function CompanyPage() {
  const { say } = useWords();
  usePageTitle(say('company.title'));
  return <CompanyPanel />;
}
