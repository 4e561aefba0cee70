#include "cli/output/csv.hpp"
#include "cli/output/history_columns.hpp"
#include "cli/output/rate_report.hpp"

namespace ringward::cli {

std::string rate_csv(const RateReport& report) {
  std::vector<std::string> header;
  for (const HistoryColumn& column : history_columns()) header.push_back(column.key);
  CsvTable table(header);
  for (const mechanical::HistoryRow& row : report.rating.chosen.history) {
    std::vector<std::string> cells;
    for (const HistoryColumn& column : history_columns()) {
      cells.push_back(csv_number(column.value(row), column.digits));
    }
    table.add(cells);
  }
  return table.text();
}

}  // namespace ringward::cli
