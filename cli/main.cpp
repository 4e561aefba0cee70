#include "cli/commands/application.hpp"

int main(int argc, char** argv) { return ringward::cli::run(argc, argv); }
