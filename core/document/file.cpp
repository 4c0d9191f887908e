#include "core/document/file.h"

#include "core/document/faults.h"

#include <fmt/format.h>

#include <fcntl.h>
#include <sys/stat.h>
#include <unistd.h>

#include <array>
#include <cerrno>
#include <cstdio>
#include <cstring>
#include <optional>

namespace quasistat::document
{

namespace
{

constexpr std::size_t mostBytes = std::size_t{256} << 20; // an endless device would fill the memory

/// An open file descriptor that is closed once.
class Descriptor
{
public:
    explicit Descriptor(int number) : m_number(number) {}
    ~Descriptor()
    {
        if (m_number >= 0) ::close(m_number);
    }
    Descriptor(const Descriptor &) = delete;
    Descriptor &operator=(const Descriptor &) = delete;
    [[nodiscard]] int number() const { return m_number; }
    /// Closes and says whether that went well: a full network disk may report it only here.
    [[nodiscard]] bool closed()
    {
        const int result = ::close(m_number);
        m_number = -1;
        return result == 0;
    }

private:
    int m_number;
};

std::string systemWords(int error)
{
    return std::strerror(error);
}

Failure unreadable(const std::string &path, const std::string &why)
{
    return fault(Reason::unreadable, "", "“{0}” cannot be read: {1}", {path, why});
}

Failure unwritable(const std::string &path, int error)
{
    return fault(Reason::unwritable, "", "“{0}” cannot be written: {1}", {path, systemWords(error)});
}

/// Writes everything; 0 or the system's error number.
int wroteAll(int descriptor, std::string_view bytes)
{
    while (!bytes.empty()) {
        const ssize_t count = ::write(descriptor, bytes.data(), bytes.size());
        if (count < 0 && errno == EINTR) continue;
        if (count < 0) return errno;
        bytes.remove_prefix(static_cast<std::size_t>(count));
    }
    return 0;
}

/// The file that `path` leads to in the end, also if a link points to nothing yet.
std::filesystem::path linkTarget(std::filesystem::path path)
{
    constexpr int mostLinks = 40; // as the system itself allows
    std::error_code error;
    for (int i = 0; i < mostLinks && std::filesystem::is_symlink(path, error); ++i) {
        const std::filesystem::path target = std::filesystem::read_symlink(path, error);
        if (error) break;
        path = target.is_absolute() ? target : path.parent_path() / target;
    }
    return path;
}

/// A new file beside `target`, with the permissions of an existing one. Created by name, not by mkstemp, so that a new
/// file gets the permissions the user's umask leaves.
struct Neighbour {
    std::filesystem::path path;
    int descriptor = -1;
};
Neighbour neighbourOf(const std::filesystem::path &target)
{
    for (int attempt = 0; attempt < 100; ++attempt) {
        Neighbour neighbour;
        neighbour.path =
            target.parent_path() / fmt::format(".{}.{}-{}", target.filename().string(), ::getpid(), attempt);
        neighbour.descriptor = ::open(neighbour.path.c_str(), O_WRONLY | O_CREAT | O_EXCL | O_CLOEXEC, 0666);
        if (neighbour.descriptor >= 0 || errno != EEXIST) return neighbour;
    }
    return {};
}

void keepOwnerAndMode(int descriptor, const struct stat &existing)
{
    // The owner can be kept only by root and matters only to root; the mode is set after it, as chown clears bits of
    // it.
    if (::fchown(descriptor, existing.st_uid, existing.st_gid) != 0) errno = 0;
    if (::fchmod(descriptor, existing.st_mode & 07777) != 0) errno = 0;
}

/// Devices and pipes cannot be replaced, and hold nothing that could be half written.
Outcome<Written> writtenInto(const std::string &path, std::string_view bytes)
{
    Descriptor file(::open(path.c_str(), O_WRONLY | O_CLOEXEC));
    if (file.number() < 0) return unwritable(path, errno);
    if (const int error = wroteAll(file.number(), bytes)) return unwritable(path, error);
    if (!file.closed()) return unwritable(path, errno);
    return Written{};
}

Outcome<Written> replaced(const std::string &path, const std::filesystem::path &target, std::string_view bytes,
                          const std::optional<struct stat> &existing)
{
    const Neighbour neighbour = neighbourOf(target);
    if (neighbour.descriptor < 0) return unwritable(path, errno);
    Descriptor file(neighbour.descriptor);
    if (existing) keepOwnerAndMode(file.number(), *existing);
    int error = wroteAll(file.number(), bytes);
    if (error == 0 && ::fsync(file.number()) != 0) error = errno;
    if (!file.closed() && error == 0) error = errno;
    if (error == 0 && ::rename(neighbour.path.c_str(), target.c_str()) != 0) error = errno;
    if (error != 0) {
        ::unlink(neighbour.path.c_str());
        return unwritable(path, error);
    }
    // The new name itself reaches the disk with its folder; a failure here leaves the new file readable all the same.
    const std::filesystem::path folder = target.parent_path().empty() ? "." : target.parent_path();
    const Descriptor directory(::open(folder.c_str(), O_RDONLY | O_DIRECTORY | O_CLOEXEC));
    if (directory.number() >= 0 && ::fsync(directory.number()) != 0) errno = 0;
    return Written{};
}

} // namespace

Outcome<std::string> fileText(const std::string &path)
{
    const bool isStandardInput = path == "-";
    const int opened = isStandardInput ? ::dup(STDIN_FILENO) : ::open(path.c_str(), O_RDONLY | O_CLOEXEC);
    const Descriptor file(opened);
    if (file.number() < 0) return unreadable(path, systemWords(errno));
    std::string text;
    std::array<char, 65536> buffer{};
    while (true) {
        const ssize_t count = ::read(file.number(), buffer.data(), buffer.size());
        if (count < 0 && errno == EINTR) continue;
        if (count < 0) return unreadable(path, systemWords(errno));
        if (count == 0) return text;
        if (text.size() > mostBytes) return unreadable(path, "it is larger than any design");
        text.append(buffer.data(), static_cast<std::size_t>(count));
    }
}

Outcome<Written> writeWhole(const std::string &path, std::string_view bytes)
{
    if (path.empty()) return unwritable(path, ENOENT);
    const std::filesystem::path target = linkTarget(path);
    struct stat status {
    };
    if (::stat(target.c_str(), &status) != 0) {
        if (errno != ENOENT) return unwritable(path, errno);
        return replaced(path, target, bytes, std::nullopt);
    }
    if (S_ISDIR(status.st_mode)) return unwritable(path, EISDIR);
    if (!S_ISREG(status.st_mode)) return writtenInto(path, bytes);
    // Replacing needs only the folder's permission; a file its owner made read-only is not replaced behind that.
    if (::access(target.c_str(), W_OK) != 0) return unwritable(path, errno);
    return replaced(path, target, bytes, status);
}

} // namespace quasistat::document
