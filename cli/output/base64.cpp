#include "cli/output/base64.hpp"

#include <openssl/evp.h>

#include <vector>

namespace ringward::cli {

std::string base64(const std::string& bytes) {
  std::vector<unsigned char> text(4 * ((bytes.size() + 2) / 3) + 1);
  const int length =
      EVP_EncodeBlock(text.data(), reinterpret_cast<const unsigned char*>(bytes.data()),
                      static_cast<int>(bytes.size()));
  return {text.begin(), text.begin() + length};
}

}  // namespace ringward::cli
