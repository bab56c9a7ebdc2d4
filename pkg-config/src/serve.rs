//! The local server: only this machine, only the files of one folder.

use crate::arguments::Browser;
use std::env;
use std::fs::File;
use std::path::{Path, PathBuf};
use std::process::{Command, Stdio};
use tiny_http::{Header, Method, Request, Response, Server};

/// The page that is shown first.
const START: &str = "article.html";

/// Serves a folder on 127.0.0.1 until Ctrl-C.
pub fn serve(folder: &Path, port: Option<u16>, browser: Browser) -> Result<(), String> {
    let (server, port) = listen(port.unwrap_or(0))?;
    let address = format!("http://127.0.0.1:{port}/{START}");
    println!("The example article is at {address} (Ctrl-C stops the server).");
    if browser == Browser::Open {
        open_browser(&address);
    }
    answer_all(&server, folder);
    Ok(())
}

fn listen(port: u16) -> Result<(Server, u16), String> {
    let server = Server::http(("127.0.0.1", port)).map_err(|cause| {
        format!(
            "Port {port} on 127.0.0.1 cannot be used: {cause}. Leave `--port` out for a free one."
        )
    })?;
    let port = server
        .server_addr()
        .to_ip()
        .map_or(port, |address| address.port());
    Ok((server, port))
}

fn answer_all(server: &Server, folder: &Path) {
    for request in server.incoming_requests() {
        // A reader who leaves before the file is through is no fault of ours.
        let _ = answer(request, folder);
    }
}

fn answer(request: Request, folder: &Path) -> std::io::Result<()> {
    if !matches!(request.method(), Method::Get | Method::Head) {
        return request.respond(plain(405, "Only GET and HEAD are answered here."));
    }
    let file = path_in(folder, request.url()).and_then(|path| {
        Some((
            content_type(&path.to_string_lossy()),
            File::open(path).ok()?,
        ))
    });
    match file {
        Some((kind, file)) => {
            let response = headers(kind)
                .into_iter()
                .fold(Response::from_file(file), Response::with_header);
            request.respond(response)
        }
        None => request.respond(plain(404, "There is no such file here.")),
    }
}

fn plain(status: u16, text: &str) -> Response<std::io::Cursor<Vec<u8>>> {
    let response = Response::from_string(format!("{text}\n")).with_status_code(status);
    headers("text/plain; charset=utf-8")
        .into_iter()
        .fold(response, Response::with_header)
}

/// A page under work must never come from the browser's cache.
fn headers(kind: &str) -> Vec<Header> {
    [
        ("Content-Type", kind),
        ("Cache-Control", "no-store"),
        ("X-Content-Type-Options", "nosniff"),
    ]
    .iter()
    .filter_map(|(name, value)| Header::from_bytes(*name, *value).ok())
    .collect()
}

/// The file that an address means, if it is one inside the folder.
fn path_in(folder: &Path, url: &str) -> Option<PathBuf> {
    let path = url.split(['?', '#']).next()?;
    let path = decode(path)?;
    let relative = path.strip_prefix('/')?;
    let relative = if relative.is_empty() { START } else { relative };
    if relative.contains(['\\', ':', '\0'])
        || relative
            .split('/')
            .any(|part| part.is_empty() || part.starts_with('.'))
    {
        return None;
    }
    // A link inside the folder may still lead out of it: compare the real places.
    let real = folder.join(relative).canonicalize().ok()?;
    (real.starts_with(folder.canonicalize().ok()?) && real.is_file()).then_some(real)
}

/// Replaces `%41` and the like; `None` where that gives no text.
fn decode(path: &str) -> Option<String> {
    let mut bytes = Vec::with_capacity(path.len());
    let mut rest = path.as_bytes();
    while let Some((first, after)) = rest.split_first() {
        if *first == b'%' {
            let digits = std::str::from_utf8(after.get(..2)?).ok()?;
            bytes.push(u8::from_str_radix(digits, 16).ok()?);
            rest = &after[2..];
        } else {
            bytes.push(*first);
            rest = after;
        }
    }
    String::from_utf8(bytes).ok()
}

/// The media type of a file by its ending.
pub fn content_type(path: &str) -> &'static str {
    match path.rsplit('.').next().unwrap_or_default() {
        "html" => "text/html; charset=utf-8",
        "js" | "mjs" => "text/javascript; charset=utf-8",
        "css" => "text/css; charset=utf-8",
        "json" | "map" => "application/json",
        "webmanifest" => "application/manifest+json",
        "wasm" => "application/wasm",
        "svg" => "image/svg+xml",
        "png" => "image/png",
        "jpg" | "jpeg" => "image/jpeg",
        "webp" => "image/webp",
        "ico" => "image/x-icon",
        "woff2" => "font/woff2",
        "ts" | "txt" | "md" => "text/plain; charset=utf-8",
        "ics" => "text/calendar; charset=utf-8",
        "csv" => "text/csv; charset=utf-8",
        _ => "application/octet-stream",
    }
}

/// Shows the page where there is a desktop to show it on; the printed address remains the way that always works.
fn open_browser(address: &str) {
    let (program, arguments): (&str, &[&str]) = if cfg!(target_os = "macos") {
        ("open", &[])
    } else if cfg!(windows) {
        ("cmd", &["/C", "start", ""])
    } else if env::var_os("DISPLAY").is_some() || env::var_os("WAYLAND_DISPLAY").is_some() {
        ("xdg-open", &[])
    } else {
        return;
    };
    let _ = Command::new(program)
        .args(arguments)
        .arg(address)
        .stdin(Stdio::null())
        .stdout(Stdio::null())
        .stderr(Stdio::null())
        .spawn();
}

#[cfg(test)]
mod tests {
    use super::*;
    use std::io::{Read, Write};
    use std::net::TcpStream;

    /// Serves a fresh folder and returns the raw answers to the given requests.
    fn answers(name: &str, requests: &[&str]) -> Vec<String> {
        let folder =
            env::temp_dir().join(format!("wanderlight-serve-{name}-{}", std::process::id()));
        std::fs::create_dir_all(folder.join("inside")).unwrap();
        std::fs::write(folder.join("secret.txt"), "secret").unwrap();
        std::fs::write(folder.join("inside/article.html"), "<p>hello").unwrap();
        std::fs::write(folder.join("inside/m.wasm"), "\0asm").unwrap();
        std::fs::write(folder.join("inside/a b.js"), "go()").unwrap();
        std::fs::write(folder.join("inside/.hidden"), "hidden").unwrap();
        let (server, port) = listen(0).unwrap();
        let inside = folder.join("inside");
        std::thread::spawn(move || answer_all(&server, &inside));
        let answers = requests
            .iter()
            .map(|request| {
                let mut stream = TcpStream::connect(("127.0.0.1", port)).unwrap();
                write!(
                    stream,
                    "{request} HTTP/1.1\r\nHost: localhost\r\nConnection: close\r\n\r\n"
                )
                .unwrap();
                let mut answer = String::new();
                stream.read_to_string(&mut answer).unwrap();
                answer
            })
            .collect();
        std::fs::remove_dir_all(&folder).unwrap();
        answers
    }

    #[test]
    fn files_come_with_their_types_and_are_not_cached() {
        let found = answers(
            "types",
            &[
                "GET /",
                "GET /m.wasm",
                "GET /a%20b.js?x=1",
                "HEAD /article.html",
            ],
        );
        for (answer, kind) in found.iter().zip([
            "text/html; charset=utf-8",
            "application/wasm",
            "text/javascript; charset=utf-8",
            "text/html; charset=utf-8",
        ]) {
            assert!(answer.starts_with("HTTP/1.1 200"), "{answer}");
            assert!(
                answer.contains(&format!("Content-Type: {kind}\r\n")),
                "{answer}"
            );
            assert!(answer.contains("Cache-Control: no-store\r\n"), "{answer}");
        }
        assert!(found[0].ends_with("<p>hello") && !found[3].contains("hello"));
    }

    #[test]
    fn nothing_outside_the_folder_is_served() {
        let requests = [
            "GET /../secret.txt",
            "GET /%2e%2e/secret.txt",
            "GET /..%2fsecret.txt",
            "GET /x/../../secret.txt",
            "GET /..\\secret.txt",
            "GET //etc/passwd",
            "GET /.hidden",
            "GET /absent.html",
            "GET /%zz",
            "GET /%00",
        ];
        for (request, answer) in requests.iter().zip(answers("outside", &requests)) {
            assert!(answer.starts_with("HTTP/1.1 404"), "{request}: {answer}");
            assert!(
                !answer.contains("secret\n") && !answer.contains("hidden"),
                "{request}: {answer}"
            );
        }
    }

    #[test]
    fn only_reading_is_allowed() {
        assert!(
            answers("reading", &["POST /article.html", "DELETE /article.html"])
                .iter()
                .all(|answer| answer.starts_with("HTTP/1.1 405"))
        );
    }
}
