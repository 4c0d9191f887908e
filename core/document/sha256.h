#pragma once
// Secure Hash Algorithm 256.

#include <string>
#include <string_view>

namespace quasistat::document
{

/// Digest of `bytes` as 64 lower-case hexadecimal digits. Source: FIPS 180-4 (2015), 5.1.1, 5.3.3, 6.2.
[[nodiscard]] std::string sha256(std::string_view bytes);

} // namespace quasistat::document
