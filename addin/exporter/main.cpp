// busbar-export FOLDER PAGE...     writes all that registers the engine with Calc; the PAGEs of the
//                                  help are those written by hand
// busbar-export --reference FILE   writes the function reference alone
//
// Knows the engine by its C interface only. Files that would not change keep their time stamp, so
// that a build goes on only where the catalogue changed.
#include <exception>
#include <filesystem>
#include <fstream>
#include <iostream>
#include <iterator>
#include <set>
#include <stdexcept>
#include <string>
#include <string_view>
#include <vector>

#include "writers.hpp"

namespace {

namespace fs = std::filesystem;

bool holds(const fs::path& file, const std::string& content) {
  std::ifstream in(file, std::ios::binary);
  if (!in) return false;
  const std::string present{std::istreambuf_iterator<char>(in), std::istreambuf_iterator<char>()};
  return present == content;
}

std::string content_of(const fs::path& file) {
  std::ifstream in(file, std::ios::binary);
  std::string content{std::istreambuf_iterator<char>(in), std::istreambuf_iterator<char>()};
  if (!in) throw std::runtime_error("cannot read " + file.string());
  return content;
}

void write(const fs::path& file, const std::string& content) {
  if (holds(file, content)) return;
  if (file.has_parent_path()) fs::create_directories(file.parent_path());
  std::ofstream out(file, std::ios::binary | std::ios::trunc);
  out << content;
  out.close();
  if (!out) throw std::runtime_error("cannot write " + file.string());
}

// Writes the pages and removes what an earlier catalogue left.
void write_help_folder(const fs::path& folder, const busbar::exporter::Catalogue& catalogue,
                       const std::vector<busbar::exporter::HelpPage>& written) {
  std::set<fs::path> wanted;
  for (const auto& [name, content] : busbar::exporter::write_help(catalogue, written)) {
    write(folder / name, content);
    wanted.insert((folder / name).lexically_normal());
  }
  for (const auto& entry : fs::recursive_directory_iterator(folder))
    if (entry.is_regular_file() && !wanted.contains(entry.path().lexically_normal()))
      fs::remove(entry.path());
}

void export_all(const fs::path& folder, const std::vector<busbar::exporter::HelpPage>& written) {
  const auto catalogue = busbar::exporter::read_catalogue();
  write(folder / "busbar.idl", busbar::exporter::write_idl(catalogue));
  write(folder / "CalcAddIns.xcu", busbar::exporter::write_registration(catalogue));
  write(folder / "functions.cpp", busbar::exporter::write_glue(catalogue));
  write(folder / "functions.md", busbar::exporter::write_reference(catalogue));
  write_help_folder(folder / "help", catalogue, written);
}

}  // namespace

int main(int argc, char** argv) {
  try {
    if (argc == 3 && std::string_view(argv[1]) == "--reference") {
      write(argv[2], busbar::exporter::write_reference(busbar::exporter::read_catalogue()));
      return 0;
    }
    if (argc >= 2 && argv[1][0] != '-') {
      std::vector<busbar::exporter::HelpPage> written;
      for (int i = 2; i < argc; ++i)
        written.push_back({fs::path(argv[i]).filename().string(), content_of(argv[i])});
      export_all(argv[1], written);
      return 0;
    }
    std::cerr << "usage: busbar-export FOLDER PAGE... | busbar-export --reference FILE\n";
    return 2;
  } catch (const std::exception& e) {
    std::cerr << "busbar-export: " << e.what() << '\n';
    return 1;
  }
}
